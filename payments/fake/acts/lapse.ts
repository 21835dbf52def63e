import type { PaymentRow } from '../books/rows'
import type { Turn } from '../turn'
import { cancelPayment } from './cancel-payment'

/** An authorisation nobody captured in its 7 days is gone: the payment ends by itself. */
export function lapseIfDue(turn: Turn, payment: PaymentRow): PaymentRow {
  if (payment.status !== 'requires_capture' || payment.chargeId === null) return payment
  const captureBeforeS = turn.draft.get('charges', payment.chargeId)?.captureBeforeS ?? null
  if (captureBeforeS === null || turn.nowS < captureBeforeS) return payment
  return cancelPayment(turn, payment, 'automatic')
}
