import type { ChargeRow, PaymentRow } from '../books/rows'
import type { CardUsed } from '../card-used'
import { newId } from '../ids'
import { presentPaymentIntent } from '../objects/payment-intent'
import type { Decline } from '../test-cards.facts'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'
import { bookMoney, processingFeeCents } from './book-money'
import { openDispute } from './open-dispute'

/** A customer's card authorisation lives 7 days (docs.stripe.com, place a hold on a payment method). */
const AUTHORISATION_DAYS = 7
const DAY_S = 86_400

function writeCharge(turn: Turn, payment: PaymentRow, card: CardUsed): ChargeRow {
  const decline = card.outcome.kind === 'decline' ? card.outcome.decline : null
  const held = !decline && payment.captureMethod === 'manual'
  const charge: ChargeRow = {
    id: newId('ch'),
    createdS: turn.nowS,
    paymentId: payment.id,
    amount: payment.amount,
    amountCaptured: 0,
    amountRefunded: 0,
    status: decline ? 'failed' : 'succeeded',
    captured: false,
    released: false,
    disputed: false,
    captureBeforeS: held ? turn.nowS + AUTHORISATION_DAYS * DAY_S : null,
    decline,
    card,
    balanceTransactionId: null,
    description: payment.description,
    transferGroup: payment.transferGroup,
    metadata: payment.metadata,
  }
  turn.draft.put({ table: 'charges', row: charge })
  return charge
}

function writeDecline(
  turn: Turn,
  payment: PaymentRow,
  failed: { charge: ChargeRow | null; decline: Decline },
): PaymentRow {
  const chargeId = failed.charge?.id ?? null
  const after: PaymentRow = {
    ...payment,
    status: 'requires_payment_method',
    paymentMethodId: null,
    card: null,
    chargeId: chargeId ?? payment.chargeId,
    lastDecline: { ...failed.decline, chargeId },
  }
  turn.draft.put({ table: 'payments', row: after })
  announce(turn, { type: 'payment_intent.payment_failed', object: presentPaymentIntent(turn, after) })
  return after
}

/** Takes `cents` of an authorised charge, at most what was authorised; the rest is released. */
export function settleCharge(
  turn: Turn,
  payment: PaymentRow,
  taken: { charge: ChargeRow; cents: number },
): PaymentRow {
  const { cents } = taken
  const balanceTransactionId = bookMoney(turn, {
    kind: 'charge',
    amount: cents,
    fee: processingFeeCents(cents),
    sourceId: taken.charge.id,
    description: payment.description ?? undefined,
  })
  const charge: ChargeRow = {
    ...taken.charge,
    captured: true,
    amountCaptured: cents,
    captureBeforeS: null,
    balanceTransactionId,
  }
  turn.draft.put({ table: 'charges', row: charge })
  const after: PaymentRow = {
    ...payment,
    status: 'succeeded',
    amountReceived: cents,
    chargeId: charge.id,
    card: null,
  }
  turn.draft.put({ table: 'payments', row: after })
  announce(turn, { type: 'payment_intent.succeeded', object: presentPaymentIntent(turn, after) })
  if (charge.card.disputed) openDispute(turn, charge, 'fraudulent')
  return after
}

function approve(turn: Turn, payment: PaymentRow, card: CardUsed): PaymentRow {
  const charge = writeCharge(turn, payment, card)
  const paid = { ...payment, lastDecline: null }
  if (payment.captureMethod === 'automatic')
    return settleCharge(turn, paid, { charge, cents: payment.amount })
  const held: PaymentRow = { ...paid, status: 'requires_capture', chargeId: charge.id, card: null }
  turn.draft.put({ table: 'payments', row: held })
  announce(turn, {
    type: 'payment_intent.amount_capturable_updated',
    object: presentPaymentIntent(turn, held),
  })
  return held
}

/** Tries a card on a payment: paid, held, declined, or waiting for its holder to answer the bank. */
export function chargeCard(turn: Turn, payment: PaymentRow, card: CardUsed): PaymentRow {
  const { outcome } = card
  if (outcome.kind === 'approve') return approve(turn, payment, card)
  if (outcome.kind === 'decline') {
    const charge = outcome.decline.atTheCounter ? null : writeCharge(turn, payment, card)
    return writeDecline(turn, payment, { charge, decline: outcome.decline })
  }
  const asking: PaymentRow = { ...payment, status: 'requires_action', card, lastDecline: null }
  turn.draft.put({ table: 'payments', row: asking })
  return asking
}
