import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { listHoldsOf, readOpenHold } from '@/server/orders/hold-store'
import { hasCommand, lockOrder, type OrderRow } from '@/server/orders/order-store'
import { orderSeenBy } from '@/server/orders/party-of'
import { refundEverything } from '@/server/orders/refund-everything'
import { showAgain } from '@/server/orders/show-order'
import { requireNewDay, type NamedDay } from '@/server/weather/require-new-day'
import { takeNewDay } from '@/server/weather/take-new-day'
import { insertRouteCheck } from '@/server/weather/weather-store'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'

type Asked = ParsedBody<Endpoints['agreeNewDay']> & { commandId: string }

/** What the buyer names, or the ship day proposed: it too may have come too near, or turned unsafe, by the time of the answer. */
async function dayNamed(order: OrderRow, { shipDay, windowId }: NamedDay): Promise<NamedDay> {
  if (shipDay !== undefined || order.handOver !== 'ship') return { shipDay, windowId }
  const hold = (await listHoldsOf([order.id])).at(-1)
  return { shipDay: hold?.proposedShipDay ?? undefined, windowId }
}

/** E19 by the buyer: the proposed day, or another one that is offered. */
export async function agreeNewDay(caller: Caller, orderId: string, asked: Asked): Promise<ShownOrder> {
  const { order, party } = await orderSeenBy(caller, orderId)
  if (party !== 'buyer') throw new Problem('not-found')
  const named = order.state === 'weather_hold' ? await dayNamed(order, asked) : asked
  const judged = order.state === 'weather_hold' ? await requireNewDay(order, named) : null
  await inTransaction(async (tx) => {
    const locked = await lockOrder(tx, order.id)
    if (!locked) throw new Problem('not-found')
    if (await hasCommand(tx, locked.id, asked.commandId)) return
    const hold = await readOpenHold(tx, order.id)
    if (!hold || locked.state !== 'weather_hold') {
      throw new Problem('order-moved', undefined, { facts: { state: locked.state } })
    }
    await takeNewDay(
      tx,
      { order: locked, hold },
      { by: 'buyer', actorId: caller.memberId, commandId: asked.commandId, ...named },
    )
    const { shipDay } = named
    if (!judged || !shipDay) return
    const { verdict, facts } = judged
    await insertRouteCheck(tx, { orderId: order.id, kind: 'reservation', shipDay, at: now(), verdict, facts })
  })
  return showAgain({ order, party })
}

/** E20: the buyer does not want another day; every cent goes back. */
export async function declineNewDay(caller: Caller, orderId: string, commandId: string): Promise<ShownOrder> {
  const { order, party } = await orderSeenBy(caller, orderId)
  if (party !== 'buyer') throw new Problem('not-found')
  await inTransaction(async (tx) => {
    const done = await applyEdge(tx, {
      edge: 'E20',
      orderId: order.id,
      commandId,
      actor: 'buyer',
      actorId: caller.memberId,
    })
    if (done.applied) await refundEverything(tx, done.order, 'hold-declined')
  })
  return showAgain({ order, party })
}
