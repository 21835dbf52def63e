import { useState } from 'react'

import { ActFailed } from '@/components/orders/act-failed'
import { zoneOf } from '@/components/orders/order-zone'
import { Button } from '@/components/ui/button'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { TextArea } from '@/components/ui/text-area'
import { useWordyAct } from '@/hooks/use-orders'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printMoment } from '@/shared/times/print-time'
import { printCents } from '@/shared/units/money'

const reasons = [
  { value: 'die-off', label: 'Animals died' },
  { value: 'failed-spawn', label: 'The spawn failed' },
  { value: 'short-count', label: 'There are fewer than I thought' },
  { value: 'other', label: 'Something else' },
] as const
type Reason = (typeof reasons)[number]['value']

const isFree = ({ freeCancelUntil, asOf }: ShownOrder) => !freeCancelUntil || asOf <= freeCancelUntil

/** What the buyer gets back, told before the press. */
function outcomeFor(order: ShownOrder): string {
  if (order.party === 'seller') return 'The buyer gets every cent back. It costs them nothing.'
  const paid = order.money.strip.heldCents
  if (isFree(order)) {
    const until = order.freeCancelUntil
      ? ` Free until ${printMoment(order.freeCancelUntil, zoneOf(order))}.`
      : ''
    return `You get ${printCents(paid)} back.${until}`
  }
  const kept = Math.min(paid, order.money.depositCents)
  return `The free time is over: the seller keeps ${printCents(kept)}, you get ${printCents(paid - kept)} back.`
}

export function CancelOrder({ order, onClose }: { order: ShownOrder; onClose: () => void }) {
  const isSeller = order.party === 'seller'
  const [reason, setReason] = useState<Reason | ''>('')
  const [note, setNote] = useState('')
  const [isMissing, setMissing] = useState(false)
  const cancel = useWordyAct('cancelOrder', order.orderId)
  const send = () => {
    if (isSeller && reason === '') {
      setMissing(true)
      return
    }
    const words = note.trim()
    cancel.mutate(
      { ...(reason ? { reason } : {}), ...(words ? { note: words } : {}) },
      { onSuccess: onClose },
    )
  }
  return (
    <Sheet
      title="Cancel the order?"
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label="Cancel the order"
          kind="danger"
          isWide
          isBusy={cancel.isPending}
          busyLabel="Cancelling"
          onPress={send}
        />
      }
    >
      <ActFailed error={cancel.error} />
      <Text>{outcomeFor(order)}</Text>
      {isSeller ? (
        <RadioGroup
          label="Why?"
          value={reason}
          choices={reasons}
          onChange={setReason}
          error={isMissing && reason === '' ? 'Choose a reason: the buyer will read it.' : undefined}
        />
      ) : null}
      <TextArea label="A word to the other party" hint="Optional" value={note} onChangeText={setNote} />
    </Sheet>
  )
}
