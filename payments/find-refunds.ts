import { askProcessor } from './ask-processor'
import { refundFacts, type RefundFacts } from './refund-facts'

const MOST = 100

/** Every refund of a payment, newest first. Keys are forgotten after 24 h: look here before an act is repeated. */
export async function findRefunds(paymentIntentId: string): Promise<RefundFacts[]> {
  const found = await askProcessor((stripe) =>
    stripe.refunds.list({ payment_intent: paymentIntentId, limit: MOST }),
  )
  return found.data.map(refundFacts)
}
