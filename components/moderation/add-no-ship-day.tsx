import { useState } from 'react'

import { noShipDayErrors } from './no-ship-day-words'

import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { DateField } from '@/components/ui/date-field'
import { ErrorSummary } from '@/components/ui/error-summary'
import { Field } from '@/components/ui/field'
import { Heading } from '@/components/ui/heading'
import { useKeepNoShipDay } from '@/hooks/use-no-ship-days'
import type { ShownNoShipDay } from '@/shared/contracts/no-ship-days'

/** A day of our own on which carriers do not work: a storm, a strike, a local holiday. */
export function AddNoShipDay({ taken }: { taken: readonly ShownNoShipDay[] }) {
  const [day, setDay] = useState('')
  const [why, setWhy] = useState('')
  const [attempt, setAttempt] = useState(0)
  const keep = useKeepNoShipDay()
  const errors = noShipDayErrors({ day, why }, taken)
  const shown = attempt > 0 ? errors : []
  const errorAt = (fieldId: string) => shown.find((one) => one.fieldId === fieldId)?.message
  const send = () => {
    setAttempt(attempt + 1)
    if (errors.length > 0) return
    keep.mutate(
      { day, why: why.trim(), isOff: false },
      {
        onSuccess: () => {
          setDay('')
          setWhy('')
          setAttempt(0)
        },
      },
    )
  }
  return (
    <Card labelledBy="add-day">
      <Heading level={2} size="lead" nativeID="add-day">
        Add a day
      </Heading>
      <ErrorSummary errors={shown} attempt={attempt} />
      {keep.error ? (
        <Banner tone="danger" title="Not added" isLive>
          {keep.error.message}
        </Banner>
      ) : null}
      <DateField
        label="Day"
        fieldId="no-ship-day"
        value={day}
        onChange={setDay}
        error={errorAt('no-ship-day')}
      />
      <Field
        label="What is on that day"
        fieldId="no-ship-why"
        hint="Sellers and buyers read it: “Ice storm, depots closed”."
        value={why}
        onChangeText={setWhy}
        maxLength={80}
        error={errorAt('no-ship-why')}
      />
      <Button label="Add this day" icon="plus" isBusy={keep.isPending} busyLabel="Adding" onPress={send} />
    </Card>
  )
}
