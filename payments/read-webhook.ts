import type Stripe from 'stripe'
import { idOf } from './id-of'
import { PaymentFailure } from './payment-failure'
import { configuredPayments } from './stripe'

export interface WebhookEvent {
  /** Unique for ever: an event may come twice, apply it once. */
  id: string
  /** The processor's own name, e.g. `checkout.session.completed`. */
  type: string
  createdAt: Date
  /** The object it speaks of. Read that object's present state; events come late and out of order. */
  objectId: string
  orderId: string | null
  sessionId: string | null
  paymentIntentId: string | null
  chargeId: string | null
  /** The seller's account: of `account.updated`, or the one a transfer went to. */
  accountId: string | null
}

type Subject = Omit<WebhookEvent, 'createdAt' | 'id' | 'type'>

const nothing: Subject = {
  objectId: '',
  orderId: null,
  sessionId: null,
  paymentIntentId: null,
  chargeId: null,
  accountId: null,
}

function orderIdOf(metadata: Stripe.Metadata | null | undefined): string | null {
  return metadata?.order_id ?? null
}

function subjectOf(event: Stripe.Event): Subject {
  switch (event.type) {
    case 'checkout.session.completed':
    case 'checkout.session.expired': {
      const session = event.data.object
      return {
        ...nothing,
        objectId: session.id,
        orderId: orderIdOf(session.metadata),
        sessionId: session.id,
        paymentIntentId: idOf(session.payment_intent),
      }
    }
    case 'payment_intent.amount_capturable_updated':
    case 'payment_intent.canceled':
    case 'payment_intent.payment_failed':
    case 'payment_intent.succeeded': {
      const payment = event.data.object
      return {
        ...nothing,
        objectId: payment.id,
        orderId: orderIdOf(payment.metadata),
        paymentIntentId: payment.id,
        chargeId: idOf(payment.latest_charge),
      }
    }
    case 'charge.refunded': {
      const charge = event.data.object
      return {
        ...nothing,
        objectId: charge.id,
        orderId: orderIdOf(charge.metadata),
        paymentIntentId: idOf(charge.payment_intent),
        chargeId: charge.id,
      }
    }
    case 'charge.dispute.closed':
    case 'charge.dispute.created':
    case 'refund.failed':
    case 'refund.updated': {
      const about = event.data.object
      return {
        ...nothing,
        objectId: about.id,
        orderId: orderIdOf(about.metadata),
        paymentIntentId: idOf(about.payment_intent),
        chargeId: idOf(about.charge),
      }
    }
    case 'transfer.created':
    case 'transfer.reversed': {
      const transfer = event.data.object
      return {
        ...nothing,
        objectId: transfer.id,
        orderId: orderIdOf(transfer.metadata),
        accountId: idOf(transfer.destination),
      }
    }
    case 'account.updated':
      return { ...nothing, objectId: event.data.object.id, accountId: event.data.object.id }
    default:
      return nothing
  }
}

function verified(rawBody: Buffer, signature: string): Stripe.Event {
  const { client, webhookSecret } = configuredPayments()
  try {
    return client.webhooks.constructEvent(rawBody, signature, webhookSecret)
  } catch (cause) {
    throw new PaymentFailure('refused', 'the webhook is not signed with our secret', {
      code: 'signature',
      cause,
    })
  }
}

/**
 * Checks the signature over the raw bytes (at most 5 minutes old, real time) and tells what the event speaks of.
 * Throws `refused` for anything not signed with our secret. Types we do not use come out with an empty objectId.
 */
export function readWebhook(received: { rawBody: Buffer; signature: string | undefined }): WebhookEvent {
  const event = verified(received.rawBody, received.signature ?? '')
  return { id: event.id, type: event.type, createdAt: new Date(event.created * 1000), ...subjectOf(event) }
}
