import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { mayAct } from '@/server/orders/order-policy'
import { lockOrder } from '@/server/orders/order-store'
import { showAgain } from '@/server/orders/show-order'
import { judgeWay } from '@/server/shipping/judge-way'
import { orderShippedFor, requireShipment } from '@/server/shipping/order-shipped'
import { insertRouteCheck } from '@/server/weather/weather-store'
import { wayOfOrder } from '@/server/shipping/ship-way'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

const moved = (state: string) => new Problem('order-moved', undefined, { facts: { state } })

/** The seller has the way looked at anew. What is found is kept with the order and changes no state. */
export async function checkRoute(caller: Caller, orderId: string): Promise<ShownOrder> {
  const shipped = await orderShippedFor('seller', caller, orderId)
  const { order, shipment } = shipped
  if (!mayAct('check-route', order, 'seller')) throw moved(order.state)
  const { charges, ...asked } = wayOfOrder(shipped)
  const { shipDay } = shipment
  const { verdict, facts } = await judgeWay({ ...asked, boxes: charges.boxes, shipDay, isFresh: true })
  await inTransaction(async (tx) => {
    const fresh = await lockOrder(tx, order.id)
    if (!fresh || !mayAct('check-route', fresh, 'seller')) throw moved(fresh?.state ?? order.state)
    const isSameDay = (await requireShipment(tx, order.id)).shipDay === shipDay
    if (!isSameDay) throw new Problem('order-moved', 'The day has just moved. Look at the way once more.')
    await insertRouteCheck(tx, { orderId: order.id, kind: 'seller', shipDay, at: now(), verdict, facts })
  })
  return showAgain(shipped)
}
