import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { settleOrder } from '@/server/money/settle-order'
import { mayAct } from '@/server/orders/order-policy'
import { hasCommand, lockOrder } from '@/server/orders/order-store'
import { changeShipment } from '@/server/orders/shipment-store'
import { showAgain } from '@/server/orders/show-order'
import { openSurvival } from '@/server/ratings/open-survival'
import { moveLateBox } from '@/server/shipping/late-box-came'
import { orderShippedFor } from '@/server/shipping/order-shipped'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

interface Told {
  orderId: number
  aliveCount: number
  commandId: string
  by: string
}

async function keep(tx: Tx, { orderId, aliveCount, commandId, by }: Told): Promise<void> {
  const order = await lockOrder(tx, orderId)
  if (!order) throw new Problem('not-found')
  if (await hasCommand(tx, orderId, commandId)) return
  if (!mayAct('report-late-arrival', order, 'buyer')) {
    throw new Problem('order-moved', undefined, { facts: { state: order.state } })
  }
  const at = now()
  await changeShipment(tx, orderId, { aliveCount, arrivedAt: at })
  if (aliveCount < order.quantity) return
  const settled = await settleOrder(tx, {
    edge: 'E41',
    orderId,
    commandId,
    actor: 'buyer',
    actorId: by,
    facts: { aliveCount },
    change: { handedOverAt: at },
  })
  if (!settled) return
  await moveLateBox(tx, { order: settled, by, to: 'delivered' })
  await openSurvival(tx, settled)
}

/** A late box came after all. All alive ends the claim and pays the seller; fewer are for a moderator to decide. */
export async function reportLateArrival(
  caller: Caller,
  orderId: string,
  { aliveCount, commandId }: { aliveCount: number; commandId: string },
): Promise<ShownOrder> {
  const shipped = await orderShippedFor('buyer', caller, orderId)
  const told = { orderId: shipped.order.id, aliveCount, commandId, by: caller.memberId }
  await inTransaction((tx) => keep(tx, told))
  return showAgain(shipped)
}
