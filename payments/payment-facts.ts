import type Stripe from 'stripe'

export interface PaymentFacts {
  paymentIntentId: string
  /** `unpaid`: begun, not paid. `authorised`: held on the card. `cancelled`: given up, by us or by lapse. */
  status: 'authorised' | 'cancelled' | 'captured' | 'unpaid'
  /** A hold the processor gave up by itself, because nobody captured in time. */
  hasLapsed: boolean
  amountCents: number
  capturableCents: number
  capturedCents: number
  refundedCents: number
  /** Null until a charge went through. */
  chargeId: string | null
  /** What the processor kept of the captured charge; null until it has booked it. */
  processorFeeCents: number | null
  /** The authorisation lapses at this moment (card rules: 7 days); null when nothing is held. */
  captureBefore: Date | null
  isDisputed: boolean
  /** The order named when the payment was opened; null for a payment of nobody's. */
  orderId: string | null
}

/** Read with this, so that one call answers everything. */
export const paymentExpansion = ['latest_charge.balance_transaction']

const statuses: Record<string, PaymentFacts['status']> = {
  canceled: 'cancelled',
  requires_capture: 'authorised',
  succeeded: 'captured',
}

function chargeOf(payment: Stripe.PaymentIntent): Stripe.Charge | null {
  const charge = payment.latest_charge
  // The latest charge of an unpaid payment is the declined one.
  return charge && typeof charge !== 'string' && charge.status === 'succeeded' ? charge : null
}

function feeOf(charge: Stripe.Charge | null): number | null {
  const booked = charge?.balance_transaction
  return booked && typeof booked !== 'string' ? booked.fee : null
}

/** A payment intent, expanded by `paymentExpansion`, as plain facts; all amounts in US cents. */
export function paymentFacts(payment: Stripe.PaymentIntent): PaymentFacts {
  const status = statuses[payment.status] ?? 'unpaid'
  const charge = chargeOf(payment)
  const captureBeforeS = charge?.payment_method_details?.card?.capture_before
  return {
    paymentIntentId: payment.id,
    status,
    hasLapsed: status === 'cancelled' && charge !== null && payment.cancellation_reason === 'automatic',
    amountCents: payment.amount,
    capturableCents: payment.amount_capturable,
    capturedCents: payment.amount_received,
    refundedCents: charge?.captured ? charge.amount_refunded : 0,
    chargeId: charge?.id ?? null,
    processorFeeCents: feeOf(charge),
    captureBefore: status === 'authorised' && captureBeforeS ? new Date(captureBeforeS * 1000) : null,
    isDisputed: charge?.disputed ?? false,
    orderId: payment.metadata.order_id ?? null,
  }
}
