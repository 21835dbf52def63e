import { askProcessor } from './ask-processor'
import { paymentExpansion, paymentFacts, type PaymentFacts } from './payment-facts'

/** A payment as the processor has it now; this, not an event, decides what happened. Throws PaymentFailure. */
export async function readPayment(paymentIntentId: string): Promise<PaymentFacts> {
  const payment = await askProcessor((stripe) =>
    stripe.paymentIntents.retrieve(paymentIntentId, { expand: paymentExpansion }),
  )
  return paymentFacts(payment)
}
