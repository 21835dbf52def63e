import type { PaymentRow } from '../books/rows'
import { badParameter } from '../failure'
import type { Turn } from '../turn'
import { settleCharge } from './charge-card'
import { lapseIfDue } from './lapse'
import { wrongState } from './wrong-state'

/** Takes at most what was authorised; `cents` null takes all of it. */
export function capturePayment(turn: Turn, found: PaymentRow, cents: number | null): PaymentRow {
  const payment = lapseIfDue(turn, found)
  const charge = payment.chargeId === null ? undefined : turn.draft.get('charges', payment.chargeId)
  if (payment.status !== 'requires_capture' || !charge) throw wrongState(turn, payment, 'captured')
  const amount = cents ?? payment.amount
  if (amount < 1 || amount > payment.amount) {
    throw badParameter(
      'amount_to_capture',
      'The amount to capture must lie between 1 and the authorised amount.',
      'amount_too_large',
    )
  }
  return settleCharge(turn, payment, { charge, cents: amount })
}
