import type { PaymentRow } from '../books/rows'
import { ApiFailure } from '../failure'
import { presentPaymentIntent } from '../objects/payment-intent'
import type { Turn } from '../turn'

/** What a lapse wrote on the way stays; the act itself did nothing. */
export function wrongState(turn: Turn, payment: PaymentRow, verb: string): ApiFailure {
  const message = `This PaymentIntent could not be ${verb} because it has a status of ${payment.status}.`
  const body = {
    type: 'invalid_request_error' as const,
    code: 'payment_intent_unexpected_state',
    message,
    payment_intent: presentPaymentIntent(turn, payment),
  }
  return new ApiFailure(400, body, { keeps: true })
}
