import { useState } from 'react'

import { markChoices, markKeys, markNames } from './rating-words'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Select } from '@/components/ui/select'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { TextArea } from '@/components/ui/text-area'
import { useRateOrder } from '@/hooks/use-ratings'
import type { Marks } from '@/shared/contracts/ratings'
import type { ShownOrder } from '@/shared/contracts/orders'

type Chosen = Record<keyof Marks, (typeof markChoices)[number]['value'] | ''>

const MOST_WORDS = 600
const chosenOf = (marks: Marks | undefined): Chosen => {
  const pick = (mark: number | undefined) =>
    markChoices.find((choice) => choice.value === String(mark))?.value ?? ''
  return { fish: pick(marks?.fish), count: pick(marks?.count), contact: pick(marks?.contact) }
}

/** Three marks and, if wanted, words; the same sheet changes them later. */
export function RateOrder({ order, onClose }: { order: ShownOrder; onClose: () => void }) {
  const { rating } = order
  const [chosen, setChosen] = useState(() => chosenOf(rating?.marks))
  const [words, setWords] = useState(rating?.words ?? '')
  const [attempt, setAttempt] = useState(0)
  const rate = useRateOrder(order.orderId, rating !== undefined)
  const missing = markKeys.filter((key) => chosen[key] === '')
  const errors =
    attempt > 0
      ? missing.map((key) => ({ fieldId: `mark-${key}`, message: `${markNames[key]}: choose a mark.` }))
      : []
  const send = () => {
    setAttempt(attempt + 1)
    if (missing.length > 0) return
    const marks = {
      fish: Number(chosen.fish),
      count: Number(chosen.count),
      contact: Number(chosen.contact),
    }
    rate.mutate({ marks, words: words.trim() }, { onSuccess: onClose })
  }
  return (
    <Sheet
      title={rating ? 'Change your rating' : 'Rate this order'}
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label={rating ? 'Save the change' : 'Give this rating'}
          isWide
          isBusy={rate.isPending}
          busyLabel="Saving"
          onPress={send}
        />
      }
    >
      <ErrorSummary errors={errors} attempt={attempt} />
      <ActFailed error={rate.error} />
      <Text>
        Everybody can read it, with your first name and initial. You can change it for 14 days; it is never
        removed.
      </Text>
      {markKeys.map((key) => (
        <Select
          key={key}
          fieldId={`mark-${key}`}
          label={markNames[key]}
          value={chosen[key]}
          choices={markChoices}
          emptyLabel="Choose a mark"
          error={errors.find((one) => one.fieldId === `mark-${key}`)?.message}
          onChange={(mark) => setChosen((before) => ({ ...before, [key]: mark }))}
        />
      ))}
      <TextArea
        label="In your words"
        isOptional
        hint="About this order only: no phone numbers, no addresses."
        value={words}
        onChangeText={setWords}
        maxLength={MOST_WORDS}
      />
    </Sheet>
  )
}
