import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { book } from '@/server/money/ledger-store'
import { insertTransfer, listPayments } from '@/server/money/payment-store'
import { refundOrder } from '@/server/money/refund-order'
import { letMoneyGo } from '@/server/orders/let-money-go'
import { changeOrder, lockOrder, type OrderRow } from '@/server/orders/order-store'
import { queueEffect } from '@/server/outbox/outbox-store'
import { noShowSplit } from '@/shared/domain/money/no-show-split'

/**
 * A forfeited order: at most the listing's deposit is kept, even when everything was paid; the rest goes back. The
 * seller gets what is kept less the fee on it. Returns the cents that go back to the card.
 */
export async function keepDeposit(tx: Tx, order: OrderRow, why: string): Promise<number> {
  await letMoneyGo(tx, order)
  const captured = (await listPayments(order.id, tx)).filter((payment) => payment.status === 'captured')
  const chargedCents = captured.reduce((sum, payment) => sum + payment.amountCents - payment.refundedCents, 0)
  const split = noShowSplit({ chargedCents, depositCents: order.depositCents, feeBp: order.feeBp })
  if (split.refundCents > 0) await refundOrder(tx, order, { amountCents: split.refundCents, why })
  const fresh = await lockOrder(tx, order.id)
  if (fresh) await changeOrder(tx, fresh, { feeCents: split.feeCents, updatedAt: now() })
  if (split.keptCents === 0) return split.refundCents
  const of = { orderId: order.id, sellerId: order.sellerId, at: now() }
  await book(tx, {
    ...of,
    kind: 'settlement',
    cause: `settle:${order.id}`,
    processorId: null,
    rows: [
      ['held', -split.keptCents],
      ['seller_payable', split.sellerCents],
      ['platform_fee', split.feeCents],
    ],
  })
  if (split.sellerCents === 0) return split.refundCents
  await insertTransfer(tx, { orderId: order.id, amountCents: split.sellerCents, at: now() })
  await queueEffect({ kind: 'transfer', ref: order.id, body: {} }, tx)
  return split.refundCents
}
