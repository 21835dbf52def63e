import { askProcessor } from './ask-processor'
import { PaymentFailure } from './payment-failure'

export interface AuthorisationToVoid {
  paymentIntentId: string
  idempotencyKey: string
}

/** Gives a hold back, or ends a payment never paid. Gone already: fine. Throws `refused` once it was captured. */
export async function voidAuthorisation(asked: AuthorisationToVoid): Promise<void> {
  const { paymentIntentId, idempotencyKey } = asked
  try {
    await askProcessor((stripe) => stripe.paymentIntents.cancel(paymentIntentId, {}, { idempotencyKey }))
  } catch (error) {
    if (!(error instanceof PaymentFailure) || error.paymentStatus !== 'canceled') throw error
  }
}
