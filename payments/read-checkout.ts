import { askProcessor } from './ask-processor'
import { idOf } from './id-of'

export interface CheckoutFacts {
  sessionId: string
  status: 'completed' | 'expired' | 'open'
  /** Where the buyer pays; null once the page is closed. */
  url: string | null
  amountCents: number
  /** Null until the buyer first tries to pay. */
  paymentIntentId: string | null
  orderId: string | null
}

/** A hosted payment page as it stands now. Whether money is held or taken, only `readPayment` tells. */
export async function readCheckout(sessionId: string): Promise<CheckoutFacts> {
  const session = await askProcessor((stripe) => stripe.checkout.sessions.retrieve(sessionId))
  return {
    sessionId: session.id,
    status: session.status === 'complete' ? 'completed' : session.status === 'expired' ? 'expired' : 'open',
    url: session.url,
    amountCents: session.amount_total ?? 0,
    paymentIntentId: idOf(session.payment_intent),
    orderId: session.metadata?.order_id ?? null,
  }
}
