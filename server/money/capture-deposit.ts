import { applyCharge } from '@/server/money/apply-charge'
import { readPaymentRow } from '@/server/money/payment-store'
import { failPoint } from '@/server/outbox/fail-point'
import { finishEffect, type Effect } from '@/server/outbox/outbox-store'
import { GiveUp } from '@/server/outbox/run-effects'
import { capture } from '@/payments/capture'
import { PaymentFailure } from '@/payments/payment-failure'
import { readPayment } from '@/payments/read-payment'

/** The seller has accepted: takes the earmarked deposit, then E07 (and E14) by the processor's own word. */
export async function captureDeposit(effect: Effect): Promise<void> {
  const payment = await readPaymentRow(effect.ref)
  if (!payment?.intentId) throw new GiveUp('nothing is authorised for this order')
  if (payment.status === 'authorised') {
    try {
      await capture({ paymentIntentId: payment.intentId, idempotencyKey: `effect:${effect.seq}` })
    } catch (error) {
      if (error instanceof PaymentFailure && error.kind === 'lapsed')
        throw new GiveUp('the authorisation has lapsed')
      throw error
    }
  }
  failPoint('capture-deposit:called')
  const facts = await readPayment(payment.intentId)
  await applyCharge({ paymentId: payment.id, orderId: payment.orderId }, { kind: 'known', facts })
  await finishEffect(effect.seq)
}
