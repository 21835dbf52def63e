import { applyCharge } from '@/server/money/apply-charge'
import { changePaymentNow, readPaymentRow } from '@/server/money/payment-store'
import { readCharge } from '@/server/money/read-charge'
import { finishEffect, type Effect } from '@/server/outbox/outbox-store'
import { expireCheckout } from '@/payments/expire-checkout'

/** Closes a payment page whose order is over; had it been paid meanwhile, the charge is applied, and so sent back. */
export async function expirePaymentPage(effect: Effect): Promise<void> {
  const payment = await readPaymentRow(effect.ref)
  if (payment?.sessionId && payment.status === 'open') {
    const { outcome } = await expireCheckout({
      sessionId: payment.sessionId,
      idempotencyKey: `effect:${effect.seq}`,
    })
    if (outcome === 'expired')
      await changePaymentNow(payment.id, { status: 'expired', updatedAt: new Date() })
    else await applyCharge({ paymentId: payment.id, orderId: payment.orderId }, await readCharge(payment))
  }
  await finishEffect(effect.seq)
}
