import { useState } from 'react'

import { dispatchErrors, tickIds, tickWords } from './dispatch-words'
import { Refusals } from './refusals'

import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Checkbox } from '@/components/ui/checkbox'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Field } from '@/components/ui/field'
import { Heading } from '@/components/ui/heading'
import { useFilledAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { PackingTick } from '@/shared/contracts/ship-acts'

/** The checklist at the packing table, then the number from the counter: the box is on its way. */
export function DispatchForm({ order }: { order: ShownOrder }) {
  const [ticks, setTicks] = useState<readonly PackingTick[]>([])
  const [tracking, setTracking] = useState('')
  const [attempt, setAttempt] = useState(0)
  const dispatch = useFilledAct('dispatchOrder', order.orderId)
  const errors = dispatchErrors({ tracking, ticks })
  const shown = attempt > 0 ? errors : []
  const errorAt = (fieldId: string) => shown.find((one) => one.fieldId === fieldId)?.message
  const toggle = (tick: PackingTick, isOn: boolean) =>
    setTicks(isOn ? [...ticks, tick] : ticks.filter((one) => one !== tick))
  const send = () => {
    setAttempt(attempt + 1)
    if (errors.length === 0) dispatch.mutate({ tracking: tracking.trim(), ticks: [...ticks] })
  }
  return (
    <Card labelledBy="dispatch">
      <Heading level={2} size="lead" nativeID="dispatch">
        Send the box
      </Heading>
      <ErrorSummary errors={shown} attempt={attempt} />
      <Refusals error={dispatch.error} title="Not sent: the animals and the money stay" />
      {tickIds.map((tick) => (
        <Checkbox
          key={tick}
          {...tickWords[tick]}
          fieldId={`tick-${tick}`}
          isChecked={ticks.includes(tick)}
          onChange={(isOn) => toggle(tick, isOn)}
          error={errorAt(`tick-${tick}`)}
        />
      ))}
      <Field
        label="Tracking number"
        fieldId="tracking"
        value={tracking}
        onChangeText={setTracking}
        maxLength={60}
        autoComplete="off"
        autoCapitalize="characters"
        spellCheck={false}
        hint="From the carrier’s receipt. The buyer reads it."
        error={errorAt('tracking')}
      />
      <Button
        label="It is on its way"
        icon="truck"
        isWide
        isBusy={dispatch.isPending}
        busyLabel="Looking at the way once more"
        onPress={send}
      />
    </Card>
  )
}
