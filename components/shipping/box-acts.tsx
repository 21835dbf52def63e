import { useState } from 'react'

import { LateArrivalForm } from './late-arrival-form'

import { ActFailed } from '@/components/orders/act-failed'
import { Banner } from '@/components/ui/banner'
import { Button } from '@/components/ui/button'
import { Confirm } from '@/components/ui/confirm'
import { usePressedAct } from '@/hooks/use-shipping-acts'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printMoment } from '@/shared/times/print-time'

/** What a buyer says of a box on its way: it is here, it has not come, it came after all. */
export function BoxActs({ order }: { order: ShownOrder }) {
  const { shipment } = order
  const [isAsking, setAsking] = useState(false)
  const act = usePressedAct(order.orderId)
  const may = new Set(order.may)
  const running = act.isPending ? act.variables : null
  if (!shipment) return null
  return (
    <>
      <ActFailed error={act.error} />
      {may.has('report-late-box') ? (
        <Banner tone="caution" title="It should have come by now">
          {`It was promised until ${printMoment(shipment.promisedAt, shipment.toZone)}. Ask the carrier with the tracking number first, then say it here.`}
        </Banner>
      ) : null}
      {may.has('report-arrival') ? (
        <Button
          label="The box is here"
          icon="box"
          isWide
          isBusy={running === 'reportArrival'}
          busyLabel="Noting the time"
          onPress={() => act.mutate('reportArrival')}
        />
      ) : null}
      {may.has('report-late-box') ? (
        <Button label="It has not come" kind="secondary" isWide onPress={() => setAsking(true)} />
      ) : null}
      {may.has('report-late-arrival') ? <LateArrivalForm order={order} /> : null}
      <Confirm
        title="It has not come?"
        isOpen={isAsking}
        actLabel="Say that it has not come"
        keepLabel="Wait a little"
        isBusy={running === 'reportLateBox'}
        busyLabel="Telling the seller"
        onAct={() => act.mutate('reportLateBox', { onSettled: () => setAsking(false) })}
        onClose={() => setAsking(false)}
      >
        A claim opens and our moderators look at it. The money stays held until then. If the box comes after
        all, say so here.
      </Confirm>
    </>
  )
}
