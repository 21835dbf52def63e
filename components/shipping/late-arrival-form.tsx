import { useState } from 'react'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { NumberField } from '@/components/ui/number-field'
import { Text } from '@/components/ui/text'
import { useFilledAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'
import { parseCount } from '@/shared/units/count'

import { aliveError, aliveOutcome } from './alive-words'

/** A late box came after all: how many are alive decides what follows. */
export function LateArrivalForm({ order }: { order: ShownOrder }) {
  const [typed, setTyped] = useState('')
  const [isTried, setTried] = useState(false)
  const report = useFilledAct('reportLateArrival', order.orderId)
  const error = aliveError(typed, order.quantity)
  const aliveCount = parseCount(typed)
  const send = () => {
    setTried(true)
    if (error === null && aliveCount !== null) report.mutate({ aliveCount })
  }
  return (
    <Card labelledBy="late-arrival">
      <Heading level={2} size="lead" nativeID="late-arrival">
        It came after all?
      </Heading>
      <ActFailed error={report.error} />
      <NumberField
        label="How many are alive"
        fieldId="alive-count"
        value={typed}
        onChangeText={setTyped}
        hint={`${order.quantity} were sent. Count before you put them in; take photos of the dead.`}
        error={isTried && error ? error : undefined}
      />
      {error === null && aliveCount !== null ? (
        <Text tint="muted">{aliveOutcome(aliveCount, order.quantity)}</Text>
      ) : null}
      <Button
        label="It came: send the count"
        icon="box"
        isWide
        isBusy={report.isPending}
        busyLabel="Sending"
        onPress={send}
      />
    </Card>
  )
}
