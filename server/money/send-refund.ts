import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { book } from '@/server/money/ledger-store'
import { finishRefund, readPaymentRow, readRefund } from '@/server/money/payment-store'
import { readOrderById } from '@/server/orders/order-store'
import { failPoint } from '@/server/outbox/fail-point'
import { finishEffect, type Effect } from '@/server/outbox/outbox-store'
import { GiveUp } from '@/server/outbox/run-effects'
import { refund as refundCharge } from '@/payments/refund'

/** Sends one refund and books it (held → card) in the same transaction that closes the effect. */
export async function sendRefund(effect: Effect): Promise<void> {
  const wanted = await readRefund(effect.ref)
  const payment = wanted ? await readPaymentRow(wanted.paymentId) : undefined
  const order = wanted ? await readOrderById(wanted.orderId) : undefined
  if (!wanted || !order || !payment?.intentId) throw new GiveUp('the charge to refund is not known')
  const sent = await refundCharge({
    paymentIntentId: payment.intentId,
    orderId: order.publicId,
    amountCents: wanted.amountCents,
    idempotencyKey: `effect:${effect.seq}`,
  })
  failPoint('refund:called')
  await inTransaction(async (tx) => {
    await finishRefund(tx, wanted.id, { processorId: sent.refundId, at: now() })
    await book(tx, {
      orderId: order.id,
      sellerId: order.sellerId,
      kind: 'refund',
      cause: `refund:${wanted.id}`,
      processorId: sent.refundId,
      rows: [
        ['held', -wanted.amountCents],
        ['buyer_card', wanted.amountCents],
      ],
      at: now(),
    })
    await finishEffect(effect.seq, tx)
  })
}
