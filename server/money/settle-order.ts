import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { book } from '@/server/money/ledger-store'
import { insertTransfer, listPayments, sumRefunds } from '@/server/money/payment-store'
import { applyEdge, type EdgeCommand } from '@/server/orders/apply-edge'
import { changeOrder, type OrderRow } from '@/server/orders/order-store'
import { queueEffect } from '@/server/outbox/outbox-store'
import { settle, type Settlement } from '@/shared/domain/money/settle'

async function splitOf(tx: Tx, order: OrderRow): Promise<Settlement> {
  const captured = (await listPayments(order.id, tx)).filter((payment) => payment.status === 'captured')
  const refunds = await sumRefunds(tx, order.id)
  return settle({
    chargedCents: captured.reduce((sum, payment) => sum + payment.amountCents, 0),
    goodsCents: order.goodsCents,
    taxCents: order.taxCents,
    refundedGoodsCents: refunds.goodsCents,
    refundedOtherCents: refunds.otherCents,
    feeBp: order.feeBp,
    debtCents: 0,
  })
}

/** E40 (E38): all is good or the window has ended. Splits what is held and queues the one transfer to the seller; null when it was done before. */
export async function settleOrder(tx: Tx, command: EdgeCommand): Promise<OrderRow | null> {
  const at = now()
  const { order, applied } = await applyEdge(tx, { ...command, change: { ...command.change, settledAt: at } })
  if (!applied) return null
  const { transferCents, feeCents, taxCents } = await splitOf(tx, order)
  await changeOrder(tx, order, { feeCents, updatedAt: at })
  // Nothing is left to split of an order that was lost whole.
  if (transferCents + feeCents + taxCents === 0) return order
  await book(tx, {
    orderId: order.id,
    sellerId: order.sellerId,
    kind: 'settlement',
    cause: `settle:${order.id}`,
    processorId: null,
    rows: [
      ['held', -(transferCents + feeCents + taxCents)],
      ['seller_payable', transferCents],
      ['platform_fee', feeCents],
      ['tax_payable', taxCents],
    ],
    at,
  })
  if (transferCents === 0) return order
  await insertTransfer(tx, { orderId: order.id, amountCents: transferCents, at })
  await queueEffect({ kind: 'transfer', ref: order.id, body: {} }, tx)
  return order
}
