import { useState } from 'react'

import { ShipDays } from './ship-days'

import { ActFailed } from '@/components/orders/act-failed'
import { Button } from '@/components/ui/button'
import { Sheet } from '@/components/ui/sheet'
import { Text } from '@/components/ui/text'
import { useOrderShipDays } from '@/hooks/use-ship-days'
import { useFilledAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'

interface Props {
  order: ShownOrder
  /** What is done with the day: agreed on or moved to, or answered to a weather hold. */
  act: 'chooseShipDay' | 'agreeNewDay'
  onClose: () => void
}

/** Another day on which the box arrives well. */
export function ChooseShipDay({ order, act, onClose }: Props) {
  const [shipDay, setShipDay] = useState('')
  const query = useOrderShipDays(order.orderId)
  const send = useFilledAct(act, order.orderId)
  const isFirst = order.state === 'deposit_paid'
  return (
    <Sheet
      title={isFirst ? 'Agree on a ship day' : 'Another ship day'}
      isOpen
      onClose={onClose}
      shape="dialog"
      footer={
        <Button
          label="Take this day"
          isWide
          isDisabled={shipDay === ''}
          isBusy={send.isPending}
          busyLabel="Moving"
          onPress={() => send.mutate({ shipDay }, { onSuccess: onClose })}
        />
      }
    >
      <ActFailed error={send.error} />
      {order.state === 'ready' ? <Text tint="muted">Each side may move the day once.</Text> : null}
      <ShipDays
        query={query}
        value={shipDay}
        onChange={setShipDay}
        without={isFirst ? undefined : order.shipment?.shipDay}
      />
    </Sheet>
  )
}
