import { askProcessor } from './ask-processor'
import { refundFacts, type RefundFacts } from './refund-facts'

/** A refund as it stands now. Throws PaymentFailure. */
export async function readRefund(refundId: string): Promise<RefundFacts> {
  return refundFacts(await askProcessor((stripe) => stripe.refunds.retrieve(refundId)))
}
