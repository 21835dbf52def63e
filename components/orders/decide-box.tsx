import { useState } from 'react'

import { ActFailed } from '@/components/orders/act-failed'
import { aliveError } from '@/components/shipping/alive-words'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { NumberField } from '@/components/ui/number-field'
import { RadioGroup } from '@/components/ui/radio-group'
import { TextArea } from '@/components/ui/text-area'
import { useWordyAct } from '@/hooks/use-orders'
import type { ShownOrder } from '@/shared/contracts/orders'
import { parseCount } from '@/shared/units/count'

const outcomes = [
  {
    value: 'arrived',
    label: 'It arrived',
    hint: 'The price of the lost ones goes back; box and freight too when fewer than half live.',
  },
  { value: 'lost', label: 'It never came', hint: 'The buyer gets everything back.' },
] as const
const LEAST_LETTERS = 10

/** Staff decide what became of a box that was late or lost; both parties read the reason. */
export function DecideBox({ order }: { order: ShownOrder }) {
  const [outcome, setOutcome] = useState<'arrived' | 'lost'>('arrived')
  const [alive, setAlive] = useState('')
  const [note, setNote] = useState('')
  const [isTried, setTried] = useState(false)
  const decide = useWordyAct('decideOrder', order.orderId)
  const words = note.trim()
  const isShort = words.length < LEAST_LETTERS
  const wrongCount = outcome === 'arrived' ? aliveError(alive, order.quantity) : null
  const send = () => {
    setTried(true)
    if (isShort || wrongCount) return
    const aliveCount = parseCount(alive)
    decide.mutate({
      outcome,
      note: words,
      ...(outcome === 'arrived' && aliveCount !== null ? { aliveCount } : {}),
    })
  }
  return (
    <Card labelledBy="decide-box">
      <Heading level={2} size="lead" nativeID="decide-box">
        Decide about the box
      </Heading>
      <ActFailed error={decide.error} />
      <RadioGroup label="What happened" value={outcome} choices={outcomes} onChange={setOutcome} />
      {outcome === 'arrived' ? (
        <NumberField
          label="How many were alive"
          value={alive}
          onChangeText={setAlive}
          hint={`${order.quantity} were sent`}
          error={isTried && wrongCount ? wrongCount : undefined}
        />
      ) : null}
      <TextArea
        label="Reason, for both parties to read"
        value={note}
        onChangeText={setNote}
        maxLength={300}
        error={isTried && isShort ? 'Say in a sentence why.' : undefined}
      />
      <Button label="Decide" isWide isBusy={decide.isPending} busyLabel="Deciding" onPress={send} />
    </Card>
  )
}
