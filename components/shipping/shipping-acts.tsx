import { useState } from 'react'

import { BoxActs } from './box-acts'
import { ChooseShipDay } from './choose-ship-day'
import { DispatchForm } from './dispatch-form'
import { HoldForWeather } from './hold-for-weather'
import { NamePapers } from './name-papers'
import { PrintPacking } from './print-packing'
import { Refusals } from './refusals'
import { WeatherHold } from './weather-hold'

import { Button } from '@/components/ui/button'
import { usePressedAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'

type Open = 'day' | 'papers' | 'hold' | null

const BEFORE_DISPATCH = ['scheduled', 'weather_hold', 'ready']

/** The acts of weather and of boxes that the server says are open. */
export function ShippingActs({ order }: { order: ShownOrder }) {
  const { shipment } = order
  const [open, setOpen] = useState<Open>(null)
  const act = usePressedAct(order.orderId)
  const may = new Set(order.may)
  const close = () => setOpen(null)
  const isPacking = order.party === 'seller' && shipment && BEFORE_DISPATCH.includes(order.state)
  const isPaperMissing = (shipment?.papersNeeded ?? []).some(
    (kind) => !shipment?.papers.some((paper) => paper.kind === kind),
  )
  return (
    <>
      <WeatherHold order={order} />
      <BoxActs order={order} />
      <Refusals error={act.error} title="That did not work" />
      {may.has('name-papers') ? (
        <Button
          label={isPaperMissing ? 'Name the papers it needs' : 'Papers for the way'}
          kind={isPaperMissing ? 'primary' : 'secondary'}
          icon="list"
          isWide
          onPress={() => setOpen('papers')}
        />
      ) : null}
      {may.has('check-route') ? (
        <Button
          label="Look at the way again"
          kind="secondary"
          icon="thermometer"
          isWide
          isBusy={act.isPending}
          busyLabel="Looking at the weather"
          onPress={() => act.mutate('checkRoute')}
        />
      ) : null}
      {isPacking ? <PrintPacking orderId={order.orderId} /> : null}
      {may.has('dispatch') ? <DispatchForm order={order} /> : null}
      {may.has('choose-ship-day') ? (
        <Button
          label={order.state === 'deposit_paid' ? 'Agree on a ship day' : 'Move to another day'}
          kind={order.state === 'deposit_paid' ? 'primary' : 'secondary'}
          isWide
          onPress={() => setOpen('day')}
        />
      ) : null}
      {may.has('hold-for-weather') ? (
        <Button label="Hold it for weather" kind="quiet" isWide onPress={() => setOpen('hold')} />
      ) : null}
      {open === 'day' ? <ChooseShipDay order={order} act="chooseShipDay" onClose={close} /> : null}
      {open === 'papers' && shipment ? (
        <NamePapers order={order} shipment={shipment} onClose={close} />
      ) : null}
      {open === 'hold' ? <HoldForWeather order={order} onClose={close} /> : null}
    </>
  )
}
