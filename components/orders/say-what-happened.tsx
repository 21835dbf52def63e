import { useState } from 'react'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { TextArea } from '@/components/ui/text-area'
import { useWordyAct } from '@/hooks/use-orders'
import type { ShownOrder } from '@/shared/contracts/orders'

interface Props {
  order: ShownOrder
  act: 'no-show' | 'contest'
  onClose: () => void
}

const LEAST_LETTERS = 10

/** One party's account of a pickup that went wrong; the other, or a moderator, reads it. */
export function SayWhatHappened({ order, act, onClose }: Props) {
  const [note, setNote] = useState('')
  const [isTried, setTried] = useState(false)
  const report = useWordyAct('reportNoShow', order.orderId)
  const contest = useWordyAct('contestNoShow', order.orderId)
  const isContest = act === 'contest'
  const words = note.trim()
  const isShort = isContest && words.length < LEAST_LETTERS
  const send = () => {
    setTried(true)
    if (isContest && !isShort) contest.mutate({ note: words }, { onSuccess: onClose })
    if (!isContest) report.mutate(words ? { note: words } : {}, { onSuccess: onClose })
  }
  return (
    <Sheet
      title={
        isContest
          ? 'Say what happened'
          : order.party === 'seller'
            ? 'The buyer did not come?'
            : 'The seller is not here?'
      }
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label={isContest ? 'Send to a moderator' : 'Say so'}
          isWide
          isBusy={report.isPending || contest.isPending}
          onPress={send}
        />
      }
    >
      <ActFailed error={report.error ?? contest.error} />
      <Text>
        {isContest
          ? 'A moderator reads both sides and decides. The money stays held until then.'
          : 'The other side has a day to object. Nothing moves before that.'}
      </Text>
      <TextArea
        label="What happened"
        hint={isContest ? 'A sentence or two' : 'Optional'}
        value={note}
        onChangeText={setNote}
        error={isTried && isShort ? 'Say in a sentence what happened.' : undefined}
      />
    </Sheet>
  )
}
