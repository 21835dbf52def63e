import type { PaymentRow, SessionRow } from '../books/rows'
import type { CardUsed } from '../card-used'
import { newId } from '../ids'
import { presentSession, totalOf } from '../objects/checkout-session'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'
import { chargeCard } from './charge-card'

/** The payment of a page exists from the first try on: until then nobody knows its id. */
function paymentOf(turn: Turn, session: SessionRow): PaymentRow {
  const begun = session.paymentId === null ? undefined : turn.draft.get('payments', session.paymentId)
  if (begun) return begun
  return {
    id: newId('pi'),
    createdS: turn.nowS,
    amount: totalOf(session),
    amountReceived: 0,
    captureMethod: session.captureMethod,
    status: 'requires_payment_method',
    description: session.description,
    transferGroup: session.transferGroup,
    metadata: session.paymentMetadata,
    paymentMethodId: null,
    card: null,
    returnUrl: session.successUrl,
    chargeId: null,
    lastDecline: null,
    canceledAtS: null,
    cancellationReason: null,
    sessionId: session.id,
  }
}

/** Completes the page once its payment is held or captured; otherwise the page stays open for another try. */
export function completeIfPaid(turn: Turn, session: SessionRow, payment: PaymentRow): SessionRow {
  const isPaid = payment.status === 'requires_capture' || payment.status === 'succeeded'
  const after: SessionRow = {
    ...session,
    paymentId: payment.id,
    status: isPaid ? 'complete' : session.status,
  }
  turn.draft.put({ table: 'sessions', row: after })
  if (isPaid) announce(turn, { type: 'checkout.session.completed', object: presentSession(turn, after) })
  return after
}

/** Somebody presses Pay on an open page. */
export function paySession(turn: Turn, session: SessionRow, card: CardUsed): PaymentRow {
  const begun: PaymentRow = { ...paymentOf(turn, session), paymentMethodId: newId('pm') }
  const payment = chargeCard(turn, begun, card)
  completeIfPaid(turn, session, payment)
  return payment
}
