import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { BOX_AND_FREIGHT } from '@/server/money/payment-store'
import { refundOrder } from '@/server/money/refund-order'
import { settleOrder } from '@/server/money/settle-order'
import type { EdgeCommand } from '@/server/orders/apply-edge'
import { lockOrder, type OrderRow } from '@/server/orders/order-store'
import { changeShipment } from '@/server/orders/shipment-store'
import { openSurvival } from '@/server/ratings/open-survival'
import { moveLateBox } from '@/server/shipping/late-box-came'
import { requireShipment } from '@/server/shipping/order-shipped'
import { Problem } from '@/shared/api/problem'
import { shortfallRefund } from '@/shared/domain/money/shortfall-refund'

/** What did not arrive alive goes back at the price paid; box and freight too when fewer than half live. */
async function refundShortfall(tx: Tx, order: OrderRow, alive: number): Promise<void> {
  const short = shortfallRefund({
    ordered: order.quantity,
    alive,
    price: { kind: 'each', unitCents: order.goodsCents / order.quantity },
    boxCents: order.boxCents,
    freightCents: order.freightCents,
    isSellersFault: false,
    promisesFreight: false,
  })
  await refundOrder(tx, order, { amountCents: short.goodsCents, why: 'late-or-lost' })
  await refundOrder(tx, order, { amountCents: short.boxAndFreightCents, why: BOX_AND_FREIGHT })
}

/** E41 of a late box: so many arrived alive; null: it is lost, and everything goes back. The rest of the money goes to the seller. */
export async function decideLateBox(tx: Tx, command: EdgeCommand, alive: number | null): Promise<void> {
  const order = await lockOrder(tx, command.orderId)
  if (!order) throw new Problem('not-found')
  const { arrivedAt } = await requireShipment(tx, order.id)
  const cameAt = arrivedAt ?? now()
  const change =
    alive === null ? {} : { handedOverAt: cameAt, countHandedOver: Math.min(alive, order.quantity) }
  if (order.state === 'claim_open') await refundShortfall(tx, order, alive ?? 0)
  const settled = await settleOrder(tx, { ...command, change })
  if (!settled) return
  if (alive !== null) await changeShipment(tx, order.id, { aliveCount: alive, arrivedAt: cameAt })
  await moveLateBox(tx, {
    order: settled,
    by: command.actorId ?? null,
    to: alive === null ? null : 'delivered',
  })
  if (alive) await openSurvival(tx, settled)
}
