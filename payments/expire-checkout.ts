import { askProcessor } from './ask-processor'
import { idOf } from './id-of'
import { PaymentFailure } from './payment-failure'
import { readCheckout } from './read-checkout'

export interface ExpiredCheckout {
  /** `completed`: the buyer was faster, the late-payment rule applies. */
  outcome: 'completed' | 'expired'
  /** Null when nobody tried to pay. */
  paymentIntentId: string | null
}

/** Closes a payment page; says so when the buyer has paid on it already. Throws PaymentFailure. */
export async function expireCheckout(asked: {
  sessionId: string
  idempotencyKey: string
}): Promise<ExpiredCheckout> {
  const { sessionId, idempotencyKey } = asked
  try {
    const session = await askProcessor((stripe) =>
      stripe.checkout.sessions.expire(sessionId, {}, { idempotencyKey }),
    )
    return { outcome: 'expired', paymentIntentId: idOf(session.payment_intent) }
  } catch (error) {
    if (!(error instanceof PaymentFailure) || error.kind !== 'refused') throw error
    const now = await readCheckout(sessionId)
    if (now.status === 'open') throw error
    return { outcome: now.status, paymentIntentId: now.paymentIntentId }
  }
}
