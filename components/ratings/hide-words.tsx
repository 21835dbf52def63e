import { useState } from 'react'

import { hidingWords } from './rating-words'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { useHideRatingWords } from '@/hooks/use-ratings'
import type { HidingReason, ShownRating } from '@/shared/contracts/ratings'

const reasons = (Object.keys(hidingWords) as HidingReason[]).map((value) => {
  const [first = '', ...rest] = hidingWords[value]
  return { value, label: first.toUpperCase() + rest.join('') }
})

/** A moderator's way to hide words that must not stand in public. Being negative is no reason. */
export function HideWords({ rating }: { rating: ShownRating }) {
  const [part, setPart] = useState<'words' | 'reply' | null>(null)
  const [reason, setReason] = useState<HidingReason>('personal-data')
  const hide = useHideRatingWords(rating.ratingId)
  return (
    <>
      {rating.words ? (
        <Button kind="quiet" icon="eye" label="Hide these words" onPress={() => setPart('words')} />
      ) : null}
      {rating.reply?.words ? (
        <Button kind="quiet" icon="eye" label="Hide the reply" onPress={() => setPart('reply')} />
      ) : null}
      <Sheet
        title={part === 'reply' ? 'Hide the reply' : 'Hide these words'}
        isOpen={part !== null}
        onClose={() => setPart(null)}
        shape="dialog"
        footer={
          <Button
            label="Hide them"
            isWide
            isBusy={hide.isPending}
            busyLabel="Hiding"
            onPress={() => part && hide.mutate({ part, reason }, { onSuccess: () => setPart(null) })}
          />
        }
      >
        {hide.error ? (
          <Banner tone="danger" title="Not hidden" isLive>
            <Text>{hide.error.message}</Text>
          </Banner>
        ) : null}
        <Text>The marks and the day-7 count stay. The reason stands where the words stood.</Text>
        <RadioGroup label="Why" value={reason} choices={reasons} onChange={setReason} />
      </Sheet>
    </>
  )
}
