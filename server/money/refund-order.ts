import type { Tx } from '@/db/transaction'
import { listPayments } from '@/server/money/payment-store'
import { refundPayment } from '@/server/money/refund-payment'
import type { OrderRow } from '@/server/orders/order-store'

/** Refunds part or all of an order: the balance charge first, then the deposit, each up to what is left of it. */
export async function refundOrder(
  tx: Tx,
  order: OrderRow,
  wanted: { amountCents: number; why: string },
): Promise<void> {
  const captured = (await listPayments(order.id, tx)).filter((payment) => payment.status === 'captured')
  const balanceFirst = captured.sort((a, b) => (a.purpose < b.purpose ? -1 : 1))
  let left = wanted.amountCents
  for (const payment of balanceFirst) {
    const amountCents = Math.min(left, payment.amountCents - payment.refundedCents)
    if (amountCents > 0) await refundPayment(tx, { order, payment, amountCents, why: wanted.why })
    left -= Math.max(0, amountCents)
  }
  if (left > 0) throw new Error(`order ${order.id}: ${left} cents more to refund than were charged`)
}
