import { useState } from 'react'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { ErrorSummary, type FormError } from '@/components/ui/error-summary'
import { Field } from '@/components/ui/field'
import { Heading } from '@/components/ui/heading'
import { NumberField } from '@/components/ui/number-field'
import { Text } from '@/components/ui/text'
import { useHandOver } from '@/hooks/use-orders'
import type { ShownOrder } from '@/shared/contracts/orders'

/** Count together, both see the number, the code last: the moment the animals change hands. */
export function HandOverForm({ order }: { order: ShownOrder }) {
  const [count, setCount] = useState(String(order.quantity))
  const [code, setCode] = useState('')
  const [attempt, setAttempt] = useState(0)
  const handOver = useHandOver(order.orderId)
  const counted = Number(count.replaceAll(',', ''))
  const errors: FormError[] = []
  if (!Number.isInteger(counted) || counted < 1) {
    errors.push({ fieldId: 'count', message: 'The count you both saw, a whole number.' })
  }
  if (!/^\d{6}$/.test(code)) errors.push({ fieldId: 'code', message: 'Six digits, from the buyer’s screen.' })
  const shown = attempt > 0 ? errors : []
  const send = () => {
    setAttempt(attempt + 1)
    if (errors.length === 0) handOver.mutate({ code, count: counted })
  }
  return (
    <Card labelledBy="hand-over">
      <Heading level={2} size="lead" nativeID="hand-over">
        Hand over
      </Heading>
      <ErrorSummary errors={shown} attempt={attempt} />
      {handOver.error ? (
        <Banner tone="danger" title="Not handed over" isLive>
          <Text>{handOver.error.message}</Text>
        </Banner>
      ) : null}
      <NumberField
        label="Counted together"
        fieldId="count"
        value={count}
        onChangeText={setCount}
        hint={`${order.quantity} were ordered`}
        error={shown.find((one) => one.fieldId === 'count')?.message}
      />
      {Number.isInteger(counted) && counted > 0 && counted < order.quantity ? (
        <Banner tone="caution" title={`${order.quantity - counted} short`}>
          <Text>The buyer gets the price of the missing animals back at once.</Text>
        </Banner>
      ) : null}
      <Field
        label="The buyer’s code"
        fieldId="code"
        value={code}
        onChangeText={(text) => setCode(text.replace(/\D/g, '').slice(0, 6))}
        inputMode="numeric"
        autoComplete="off"
        hint="Six digits. The buyer gives it last."
        error={shown.find((one) => one.fieldId === 'code')?.message}
      />
      <Button
        label={`Hand over ${Number.isInteger(counted) && counted > 0 ? counted : ''}`.trim()}
        icon="check"
        isWide
        isBusy={handOver.isPending}
        busyLabel="Handing over"
        onPress={send}
      />
    </Card>
  )
}
