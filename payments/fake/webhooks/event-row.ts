import type Stripe from 'stripe'

/** The event types this practice processor sends. */
export type EventName = Extract<
  Stripe.Event['type'],
  | 'account.updated'
  | 'charge.captured'
  | 'charge.dispute.closed'
  | 'charge.dispute.created'
  | 'charge.refunded'
  | 'checkout.session.completed'
  | 'checkout.session.expired'
  | 'payment_intent.amount_capturable_updated'
  | 'payment_intent.canceled'
  | 'payment_intent.payment_failed'
  | 'payment_intent.succeeded'
  | 'refund.updated'
  | 'transfer.created'
  | 'transfer.reversed'
>

export interface EventRow {
  id: string
  createdS: number
  type: EventName
  /** The object as it stood when the event happened. */
  object: Stripe.Event.Data.Object
  accountId: string | null
  requestId: string | null
  idempotencyKey: string | null
}
