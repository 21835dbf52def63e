import { askProcessor } from './ask-processor'
import { refundFacts, type RefundFacts } from './refund-facts'

export interface RefundToMake {
  paymentIntentId: string
  orderId: string
  /** 1 to what is left of the charge. */
  amountCents: number
  idempotencyKey: string
}

/** Back to the card that paid, in part or in full, several times. More than is left throws `refused`. */
export async function refund(wanted: RefundToMake): Promise<RefundFacts> {
  const { idempotencyKey } = wanted
  const made = await askProcessor((stripe) =>
    stripe.refunds.create(
      {
        payment_intent: wanted.paymentIntentId,
        amount: wanted.amountCents,
        metadata: { order_id: wanted.orderId, act_key: idempotencyKey },
      },
      { idempotencyKey },
    ),
  )
  return refundFacts(made)
}
