import { askProcessor } from './ask-processor'
import { idOf } from './id-of'
import { PaymentFailure } from './payment-failure'
import { transferGroupOf } from './transfer-group'

export interface CheckoutToOpen {
  orderId: string
  part: 'balance' | 'deposit' | 'full'
  /** `manual` only holds the amount on the card; it must be captured within 7 days. */
  capture: 'automatic' | 'manual'
  /** At least 50. */
  amountCents: number
  /** What the buyer reads beside the amount. */
  description: string
  buyerEmail?: string
  /** When the page closes by itself, 30 minutes to 24 hours ahead; left out: 24 hours. Same key, same moment. */
  closesAt?: Date
  /** May hold `{CHECKOUT_SESSION_ID}`. */
  successUrl: string
  cancelUrl: string
  idempotencyKey: string
}

export interface OpenedCheckout {
  sessionId: string
  /** Where the buyer pays. */
  url: string
  /** Null until the buyer first tries to pay. */
  paymentIntentId: string | null
}

/** Opens a hosted payment page for one part of an order. Throws PaymentFailure. */
export async function openCheckout(wanted: CheckoutToOpen): Promise<OpenedCheckout> {
  const metadata = { order_id: wanted.orderId, part: wanted.part }
  const session = await askProcessor((stripe) =>
    stripe.checkout.sessions.create(
      {
        mode: 'payment',
        allowed_payment_method_types: ['card'],
        line_items: [
          {
            quantity: 1,
            price_data: {
              currency: 'usd',
              unit_amount: wanted.amountCents,
              product_data: { name: wanted.description },
            },
          },
        ],
        payment_intent_data: {
          capture_method: wanted.capture,
          description: wanted.description,
          metadata,
          transfer_group: transferGroupOf(wanted.orderId),
        },
        metadata,
        client_reference_id: wanted.orderId,
        ...(wanted.buyerEmail ? { customer_email: wanted.buyerEmail } : {}),
        ...(wanted.closesAt ? { expires_at: Math.floor(wanted.closesAt.getTime() / 1000) } : {}),
        success_url: wanted.successUrl,
        cancel_url: wanted.cancelUrl,
      },
      { idempotencyKey: wanted.idempotencyKey },
    ),
  )
  if (!session.url)
    throw new PaymentFailure('unknown', `checkout ${session.id} was opened without an address`)
  return { sessionId: session.id, url: session.url, paymentIntentId: idOf(session.payment_intent) }
}
