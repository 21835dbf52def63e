import { changePaymentNow, readPaymentRow } from '@/server/money/payment-store'
import { failPoint } from '@/server/outbox/fail-point'
import { finishEffect, type Effect } from '@/server/outbox/outbox-store'
import { voidAuthorisation } from '@/payments/void-authorisation'

/** Lets an earmarked deposit go. One that has lapsed by itself is gone as well. */
export async function letAuthorisationGo(effect: Effect): Promise<void> {
  const payment = await readPaymentRow(effect.ref)
  if (payment?.intentId && payment.status === 'authorised') {
    await voidAuthorisation({ paymentIntentId: payment.intentId, idempotencyKey: `effect:${effect.seq}` })
    failPoint('void-authorisation:called')
    await changePaymentNow(payment.id, { status: 'voided', updatedAt: new Date() })
  }
  await finishEffect(effect.seq)
}
