import { useState } from 'react'

import { isWhyShort } from './hold-words'
import { ShipDays } from './ship-days'
import { WindowChoice } from './window-choice'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { Field } from '@/components/ui/field'
import { RadioGroup } from '@/components/ui/radio-group'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { useOrderShipDays } from '@/hooks/use-ship-days'
import { useFilledAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'

const naming = [
  { value: 'day', label: 'I propose another day' },
  {
    value: 'none',
    label: 'I cannot name a day yet',
    hint: 'Then the buyer’s silence ends the order and everything paid goes back.',
  },
] as const

/** The seller stops a day for weather: why, and what instead. */
export function HoldForWeather({ order, onClose }: { order: ShownOrder; onClose: () => void }) {
  const [why, setWhy] = useState('')
  const [names, setNames] = useState<'day' | 'none'>('day')
  const [day, setDay] = useState('')
  const [isTried, setTried] = useState(false)
  const isShipped = order.handOver === 'ship'
  const shipDays = useOrderShipDays(order.orderId, isShipped && names === 'day')
  const hold = useFilledAct('holdForWeather', order.orderId)
  const isDayMissing = names === 'day' && day === ''
  const send = () => {
    setTried(true)
    if (isWhyShort(why) || isDayMissing) return
    const proposed = names === 'none' ? {} : isShipped ? { shipDay: day } : { windowId: day }
    hold.mutate({ why: why.trim(), ...proposed }, { onSuccess: onClose })
  }
  const dayError = isTried && isDayMissing ? 'Choose a day, or say that you cannot name one yet.' : undefined
  return (
    <Sheet
      title="Hold it for weather"
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label="Hold it and tell the buyer"
          isWide
          isBusy={hold.isPending}
          busyLabel="Holding"
          onPress={send}
        />
      }
    >
      <ActFailed error={hold.error} />
      <Text>The buyer may agree, choose another day, or end the order and get every cent back.</Text>
      <Field
        label="What does the weather do?"
        hint="The buyer reads it."
        value={why}
        onChangeText={setWhy}
        maxLength={200}
        error={
          isTried && isWhyShort(why)
            ? 'Say in a few words what the weather does; the buyer reads it.'
            : undefined
        }
      />
      <RadioGroup label="And then?" value={names} choices={naming} onChange={setNames} />
      {names === 'day' && isShipped ? (
        <ShipDays
          query={shipDays}
          value={day}
          onChange={setDay}
          error={dayError}
          without={order.shipment?.shipDay}
        />
      ) : null}
      {names === 'day' && !isShipped ? (
        <>
          <WindowChoice
            order={order}
            value={day}
            onChange={setDay}
            emptyWords="There is no other window yet: add one to the listing first, or say that you cannot name a day."
          />
          {dayError ? <Text tint="danger">{dayError}</Text> : null}
        </>
      ) : null}
    </Sheet>
  )
}
