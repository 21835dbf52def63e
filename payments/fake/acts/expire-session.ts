import type { SessionRow } from '../books/rows'
import { presentSession } from '../objects/checkout-session'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'
import { cancelPayment } from './cancel-payment'

/** Closes an open page; a payment begun on it (declined, or waiting for the bank) ends with it. */
export function expireSession(turn: Turn, session: SessionRow): SessionRow {
  const payment = session.paymentId === null ? undefined : turn.draft.get('payments', session.paymentId)
  if (payment && payment.status !== 'canceled') cancelPayment(turn, payment, 'abandoned')
  const after: SessionRow = { ...session, status: 'expired' }
  turn.draft.put({ table: 'sessions', row: after })
  announce(turn, { type: 'checkout.session.expired', object: presentSession(turn, after) })
  return after
}
