import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { book } from '@/server/money/ledger-store'
import { insertTransfer, listPayments } from '@/server/money/payment-store'
import { applyEdge, type EdgeCommand } from '@/server/orders/apply-edge'
import { queueEffect } from '@/server/outbox/outbox-store'
import { settle } from '@/shared/domain/money/settle'

/** E40 (E38): all is good or the window has ended. Splits what is held and queues the one transfer to the seller. */
export async function settleOrder(tx: Tx, command: EdgeCommand): Promise<void> {
  const { order, applied } = await applyEdge(tx, { ...command, change: { settledAt: now() } })
  if (!applied) return
  const captured = (await listPayments(order.id, tx)).filter((payment) => payment.status === 'captured')
  const chargedCents = captured.reduce((sum, payment) => sum + payment.amountCents, 0)
  const split = settle({
    chargedCents,
    refundedCents: order.refundedCents,
    taxCents: order.taxCents,
    feeCents: order.feeCents,
    debtRecoveredCents: 0,
  })
  const { transferCents } = split
  await book(tx, {
    orderId: order.id,
    sellerId: order.sellerId,
    kind: 'settlement',
    cause: `settle:${order.id}`,
    processorId: null,
    rows: [
      ['held', -(transferCents + order.feeCents + order.taxCents)],
      ['seller_payable', transferCents],
      ['platform_fee', order.feeCents],
      ['tax_payable', order.taxCents],
    ],
    at: now(),
  })
  if (transferCents === 0) return
  await insertTransfer(tx, { orderId: order.id, amountCents: transferCents, at: now() })
  await queueEffect({ kind: 'transfer', ref: order.id, body: {} }, tx)
}
