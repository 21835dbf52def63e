import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { mayAct, type Party } from '@/server/orders/order-policy'
import { hasCommand, lockOrder, type OrderRow } from '@/server/orders/order-store'
import { changeShipment } from '@/server/orders/shipment-store'
import { showAgain } from '@/server/orders/show-order'
import type { JudgedWay } from '@/server/shipping/judge-way'
import { orderShipped, requireShipment } from '@/server/shipping/order-shipped'
import { requireLawfulDay, requireSafeWay } from '@/server/shipping/require-ship-day'
import { insertRouteCheck } from '@/server/weather/weather-store'
import { promisedAtOf, shipSlot } from '@/server/shipping/ship-slot'
import { wayOfOrder } from '@/server/shipping/ship-way'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { JudgedShipDay } from '@/shared/domain/shipping/ship-days'

interface Moving {
  caller: Caller
  party: Party
  day: JudgedShipDay
  judged: JudgedWay
  commandId: string
}

const closed = () =>
  new Problem('order-moved', 'The day can no longer be moved here. Write to the other party.')

const moveOf = (order: OrderRow, party: Party) =>
  party === 'buyer' ? { buyerMoves: order.buyerMoves + 1 } : { sellerMoves: order.sellerMoves + 1 }

/** E14 for an order without a day; E28 moves a ready one back to `scheduled`, once for each side. */
async function move(tx: Tx, orderId: number, moving: Moving): Promise<void> {
  const { party, day, judged, commandId, caller } = moving
  const { shipDay, arriveDay } = day
  const order = await lockOrder(tx, orderId)
  if (!order) throw new Problem('not-found')
  if (await hasCommand(tx, orderId, commandId)) return
  if (!mayAct('choose-ship-day', order, party)) throw closed()
  const { toZone } = await requireShipment(tx, orderId)
  await changeShipment(tx, orderId, { shipDay, arriveDay, promisedAt: promisedAtOf(arriveDay, toZone) })
  const { verdict, facts } = judged
  const kind = party === 'seller' ? 'seller' : 'reservation'
  await insertRouteCheck(tx, { orderId, kind, shipDay, at: now(), verdict, facts })
  const isFirst = order.state === 'deposit_paid'
  await applyEdge(tx, {
    edge: isFirst ? 'E14' : 'E28',
    orderId,
    commandId,
    actor: 'both',
    actorId: caller.memberId,
    facts: { shipDay },
    change: {
      ...shipSlot(shipDay, order.zone),
      isDayBySilence: false,
      ...(isFirst ? {} : moveOf(order, party)),
    },
  })
}

export async function chooseShipDay(
  caller: Caller,
  orderId: string,
  asked: { shipDay: string; commandId: string },
): Promise<ShownOrder> {
  const shipped = await orderShipped(caller, orderId)
  const { order, party, shipment } = shipped
  if (party === 'staff') throw new Problem('not-allowed', 'The parties move the day between them.')
  const { shipDay, commandId } = asked
  if (!mayAct('choose-ship-day', order, party)) throw closed()
  if (order.state === 'ready' && shipDay === shipment.shipDay) {
    throw new Problem('fields-invalid', undefined, {
      errors: [{ detail: 'That is the day already agreed.', pointer: '#/shipDay' }],
    })
  }
  const way = wayOfOrder(shipped)
  const day = await requireLawfulDay(way, { shipDay, pointer: '#/shipDay' })
  const judged = await requireSafeWay(way, shipDay)
  await inTransaction((tx) => move(tx, order.id, { caller, party, day, judged, commandId }))
  return showAgain(shipped)
}
