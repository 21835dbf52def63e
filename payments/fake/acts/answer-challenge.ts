import type { PaymentRow } from '../books/rows'
import type { CardOutcome } from '../test-cards.facts'
import type { Turn } from '../turn'
import { chargeCard } from './charge-card'

const refused: CardOutcome = {
  kind: 'decline',
  decline: {
    code: 'payment_intent_authentication_failure',
    message: 'The payment was not approved with the bank. Try again or use another card.',
    atTheCounter: true,
  },
}

/** The card's holder approves or refuses with the bank; does nothing when nobody waits for an answer. */
export function answerChallenge(turn: Turn, payment: PaymentRow, isApproved: boolean): PaymentRow {
  const { card } = payment
  if (payment.status !== 'requires_action' || !card || card.outcome.kind !== 'challenge') return payment
  return chargeCard(turn, payment, { ...card, outcome: isApproved ? card.outcome.after : refused })
}
