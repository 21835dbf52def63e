import type Stripe from 'stripe'

export interface RefundFacts {
  refundId: string
  amountCents: number
  /** A refund is a state: it may wait (`pending`) until the platform's balance bears it, and it may fail. */
  status: 'failed' | 'pending' | 'succeeded'
  /** The idempotency key it was asked for with; null for a refund made by hand. */
  actKey: string | null
}

/** The processor's statuses in ours: `requires_action` waits, `canceled` has failed. */
export function refundFacts(refund: Stripe.Refund): RefundFacts {
  const isDone = refund.status === 'succeeded'
  const hasFailed = refund.status === 'failed' || refund.status === 'canceled'
  return {
    refundId: refund.id,
    amountCents: refund.amount,
    status: isDone ? 'succeeded' : hasFailed ? 'failed' : 'pending',
    actKey: refund.metadata?.act_key ?? null,
  }
}
