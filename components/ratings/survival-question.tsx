import { useState } from 'react'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { Card } from '@/components/ui/card'
import { Heading } from '@/components/ui/heading'
import { NumberField } from '@/components/ui/number-field'
import { Text } from '@/components/ui/text'
import { useAnswerSurvival } from '@/hooks/use-ratings'
import type { ShownSurvival } from '@/shared/contracts/ratings'
import { printDay } from '@/shared/times/print-time'
import { parseCount, printCount } from '@/shared/units/count'

interface Props {
  orderId: string
  survival: ShownSurvival
  mayAnswer: boolean
  zone: string
}

/** Day 7: how many of those handed over are alive. */
export function SurvivalQuestion({ orderId, survival, mayAnswer, zone }: Props) {
  const { handedOver, alive, openUntil } = survival
  const [typed, setTyped] = useState(alive === undefined ? '' : String(alive))
  const [isTried, setTried] = useState(false)
  const answer = useAnswerSurvival(orderId)
  const count = typed.trim() === '' ? null : parseCount(typed)
  const isBad = count === null || count < 0 || count > handedOver
  const told =
    alive === undefined ? '' : `${printCount(alive)} of ${printCount(handedOver)} alive after 7 days.`
  if (!mayAnswer && !told) return null
  return (
    <Card labelledBy="survival">
      <Heading level={2} size="lead" nativeID="survival">
        After seven days
      </Heading>
      {told ? <Text>{told}</Text> : null}
      {mayAnswer ? (
        <>
          <ActFailed error={answer.error} />
          <NumberField
            label={`How many of the ${printCount(handedOver)} ${told ? 'were alive after 7 days' : 'are alive now'}?`}
            hint={`Roughly is fine, and so is 0. ${told ? 'You can correct it' : 'You can answer'} until ${printDay(openUntil, zone)}.`}
            value={typed}
            onChangeText={setTyped}
            inputMode="numeric"
            error={
              isTried && isBad ? `A whole number from 0 to ${printCount(handedOver)}, please.` : undefined
            }
          />
          <Button
            label={told ? 'Correct the number' : 'Say how many'}
            kind={told ? 'secondary' : 'primary'}
            isWide
            isBusy={answer.isPending}
            busyLabel="Saving"
            onPress={() => {
              setTried(true)
              if (!isBad) answer.mutate({ alive: count })
            }}
          />
        </>
      ) : null}
    </Card>
  )
}
