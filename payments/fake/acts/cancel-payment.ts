import type { PaymentRow } from '../books/rows'
import { presentPaymentIntent } from '../objects/payment-intent'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'

/** Ends a payment that was not captured and gives the authorisation back. The caller has checked the state. */
export function cancelPayment(
  turn: Turn,
  payment: PaymentRow,
  reason: PaymentRow['cancellationReason'],
): PaymentRow {
  const charge = payment.chargeId === null ? undefined : turn.draft.get('charges', payment.chargeId)
  if (charge?.status === 'succeeded') {
    turn.draft.put({ table: 'charges', row: { ...charge, released: true, captureBeforeS: null } })
  }
  const after: PaymentRow = {
    ...payment,
    status: 'canceled',
    card: null,
    canceledAtS: turn.nowS,
    cancellationReason: reason,
  }
  turn.draft.put({ table: 'payments', row: after })
  announce(turn, { type: 'payment_intent.canceled', object: presentPaymentIntent(turn, after) })
  return after
}
