import type { Tx } from '@/db/transaction'
import { listPayments } from '@/server/money/payment-store'
import type { OrderRow } from '@/server/orders/order-store'
import { queueEffect } from '@/server/outbox/outbox-store'

/** An order that ends before anything was captured: pages still open are closed, what is earmarked is let go. */
export async function letMoneyGo(tx: Tx, order: OrderRow): Promise<void> {
  for (const payment of await listPayments(order.id, tx)) {
    if (payment.status === 'authorised') {
      await queueEffect({ kind: 'void-authorisation', ref: payment.id, body: {} }, tx)
    }
    if (payment.status === 'open')
      await queueEffect({ kind: 'expire-checkout', ref: payment.id, body: {} }, tx)
  }
}
