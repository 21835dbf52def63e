import { askProcessor } from './ask-processor'
import { PaymentFailure } from './payment-failure'
import { paymentExpansion, paymentFacts, type PaymentFacts } from './payment-facts'
import { readPayment } from './read-payment'

export interface CaptureToMake {
  paymentIntentId: string
  idempotencyKey: string
}

export interface Captured {
  capturedCents: number
  chargeId: string
  /** Null when the processor has not booked its fee yet: `readPayment` tells later. */
  processorFeeCents: number | null
}

function capturedOf(facts: PaymentFacts): Captured {
  if (facts.status !== 'captured' || facts.chargeId === null) {
    throw new PaymentFailure(
      'unknown',
      `payment ${facts.paymentIntentId} is ${facts.status} after its capture`,
    )
  }
  return {
    capturedCents: facts.capturedCents,
    chargeId: facts.chargeId,
    processorFeeCents: facts.processorFeeCents,
  }
}

/** Takes the whole authorised amount. Captured before: the same facts again. Throws `lapsed` when the hold is gone. */
export async function capture({ paymentIntentId, idempotencyKey }: CaptureToMake): Promise<Captured> {
  try {
    const payment = await askProcessor((stripe) =>
      stripe.paymentIntents.capture(paymentIntentId, { expand: paymentExpansion }, { idempotencyKey }),
    )
    return capturedOf(paymentFacts(payment))
  } catch (error) {
    if (!(error instanceof PaymentFailure) || error.paymentStatus !== 'succeeded') throw error
    return capturedOf(await readPayment(paymentIntentId))
  }
}
