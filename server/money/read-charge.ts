import type { PaymentRow } from '@/server/money/payment-store'
import { readCheckout } from '@/payments/read-checkout'
import type { PaymentFacts } from '@/payments/payment-facts'
import { readPayment } from '@/payments/read-payment'

/** `open`: the buyer may still pay. `closed`: the page is gone unpaid. `known`: the processor's facts of the payment. */
export type ChargeState = { kind: 'open' } | { kind: 'closed' } | { kind: 'known'; facts: PaymentFacts }

/** How one of our charges stands with the processor right now. Throws PaymentFailure. */
export async function readCharge(payment: PaymentRow): Promise<ChargeState> {
  if (payment.status !== 'opening' && payment.status !== 'open' && payment.intentId) {
    return { kind: 'known', facts: await readPayment(payment.intentId) }
  }
  if (!payment.sessionId) return { kind: 'open' }
  const page = await readCheckout(payment.sessionId)
  if (page.status === 'completed' && page.paymentIntentId) {
    return { kind: 'known', facts: await readPayment(page.paymentIntentId) }
  }
  return { kind: page.status === 'expired' ? 'closed' : 'open' }
}
