import type { Tx } from '@/db/transaction'
import { listPayments } from '@/server/money/payment-store'
import { refundOrder } from '@/server/money/refund-order'
import { letMoneyGo } from '@/server/orders/let-money-go'
import type { OrderRow } from '@/server/orders/order-store'

/**
 * Every cent goes back: what is only earmarked is let go, what was taken is refunded. The platform bears the cost.
 * Returns the cents that go back to the card.
 */
export async function refundEverything(tx: Tx, order: OrderRow, why: string): Promise<number> {
  await letMoneyGo(tx, order)
  const captured = (await listPayments(order.id, tx)).filter((payment) => payment.status === 'captured')
  const amountCents = captured.reduce((sum, payment) => sum + payment.amountCents - payment.refundedCents, 0)
  if (amountCents > 0) await refundOrder(tx, order, { amountCents, why })
  return amountCents
}
