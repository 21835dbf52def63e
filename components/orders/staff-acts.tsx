import { useState } from 'react'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { RadioGroup } from '@/components/ui/radio-group'
import { TextArea } from '@/components/ui/text-area'
import { useWordyAct } from '@/hooks/use-orders'
import type { ShownOrder } from '@/shared/contracts/orders'

const causes = [
  { value: 'prohibited-species', label: 'A species we do not list' },
  { value: 'recall', label: 'Recall of the batch' },
  { value: 'fraud', label: 'Fraud' },
  { value: 'seller-gone', label: 'The seller is gone' },
] as const
const animals = [
  { value: 'frozen', label: 'Keep them out of sale' },
  { value: 'free', label: 'Back on sale' },
] as const
const outcomes = [
  { value: 'handed-over', label: 'They were handed over: pay the seller' },
  { value: 'buyer-absent', label: 'The buyer did not come: keep the deposit' },
  { value: 'seller-absent', label: 'The seller was not there: refund everything' },
] as const
const LEAST_LETTERS = 10
type Value<T extends readonly { value: string }[]> = T[number]['value']

/** Staff decide an unclear hand-over, or stop an order; both parties read the reason. */
export function StaffActs({ order }: { order: ShownOrder }) {
  const isDecision = order.may.includes('decide')
  const [cause, setCause] = useState<Value<typeof causes>>('prohibited-species')
  const [where, setWhere] = useState<Value<typeof animals>>('frozen')
  const [outcome, setOutcome] = useState<Value<typeof outcomes>>('handed-over')
  const [note, setNote] = useState('')
  const [isTried, setTried] = useState(false)
  const stop = useWordyAct('stopOrder', order.orderId)
  const decide = useWordyAct('decideOrder', order.orderId)
  const words = note.trim()
  const send = () => {
    setTried(true)
    if (words.length < LEAST_LETTERS) return
    if (isDecision) decide.mutate({ outcome, note: words })
    else stop.mutate({ cause, animals: where, note: words })
  }
  return (
    <Card labelledBy="staff-acts">
      <Heading level={2} size="lead" nativeID="staff-acts">
        {isDecision ? 'Decide the hand-over' : 'Stop this order'}
      </Heading>
      <ActFailed error={stop.error ?? decide.error} />
      {isDecision ? (
        <RadioGroup label="What happened" value={outcome} choices={outcomes} onChange={setOutcome} />
      ) : (
        <>
          <RadioGroup label="Cause" value={cause} choices={causes} onChange={setCause} />
          <RadioGroup label="The animals" value={where} choices={animals} onChange={setWhere} />
        </>
      )}
      <TextArea
        label="Reason, for both parties to read"
        value={note}
        onChangeText={setNote}
        error={isTried && words.length < LEAST_LETTERS ? 'Say in a sentence why.' : undefined}
      />
      <Button
        label={isDecision ? 'Decide' : 'Stop the order and refund everything'}
        kind={isDecision ? 'primary' : 'danger'}
        isWide
        isBusy={stop.isPending || decide.isPending}
        onPress={send}
      />
    </Card>
  )
}
