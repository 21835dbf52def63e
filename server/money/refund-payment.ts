import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { insertRefund, type PaymentRow } from '@/server/money/payment-store'
import { changeOrder, lockOrder, type OrderRow } from '@/server/orders/order-store'
import { queueEffect } from '@/server/outbox/outbox-store'

export interface RefundWanted {
  order: OrderRow
  payment: PaymentRow
  amountCents: number
  why: string
}

/** Writes a refund of one charge and the effect that sends it; the ledger follows when the processor has taken it. */
export async function refundPayment(tx: Tx, wanted: RefundWanted): Promise<void> {
  const { order, payment, amountCents, why } = wanted
  const rest = payment.amountCents - payment.refundedCents
  if (amountCents <= 0) return
  if (amountCents > rest)
    throw new Error(`refund of ${amountCents} is more than the ${rest} left of payment ${payment.id}`)
  const at = now()
  const refundId = await insertRefund(tx, { orderId: order.id, paymentId: payment.id, amountCents, why, at })
  const fresh = await lockOrder(tx, order.id)
  if (fresh) await changeOrder(tx, fresh, { refundedCents: fresh.refundedCents + amountCents, updatedAt: at })
  await queueEffect({ kind: 'refund', ref: refundId, body: { paymentId: payment.id, orderId: order.id } }, tx)
}
