import type { ChargeRow, DisputeRow } from '../books/rows'
import { refusal } from '../failure'
import { newId } from '../ids'
import { presentDispute } from '../objects/dispute'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'
import { bookMoney } from './book-money'

// From memory: the fee the US platform pays for a dispute, and a usual time to answer.
const DISPUTE_FEE_CENTS = 1500
const ANSWER_DAYS = 9
const DAY_S = 86_400

/** The card's holder asks the bank for the money back: the processor takes it from the platform at once. */
export function openDispute(turn: Turn, charge: ChargeRow, reason: string): DisputeRow {
  const left = charge.amountCaptured - charge.amountRefunded
  if (!charge.captured || charge.disputed || left === 0) {
    throw refusal(
      undefined,
      'Only a captured charge that is not refunded in full can be disputed, and only once.',
    )
  }
  const id = newId('du')
  const move = bookMoney(turn, { kind: 'adjustment', amount: -left, fee: DISPUTE_FEE_CENTS, sourceId: id })
  const dispute: DisputeRow = {
    id,
    createdS: turn.nowS,
    dueByS: turn.nowS + ANSWER_DAYS * DAY_S,
    chargeId: charge.id,
    paymentId: charge.paymentId,
    amount: left,
    reason,
    status: 'needs_response',
    balanceTransactionIds: [move],
  }
  turn.draft.put({ table: 'disputes', row: dispute })
  turn.draft.put({ table: 'charges', row: { ...charge, disputed: true } })
  announce(turn, { type: 'charge.dispute.created', object: presentDispute(turn, dispute) })
  return dispute
}

/** Won: the money comes back, the fee does not (from memory). Lost: it stays with the card's holder. */
export function closeDispute(turn: Turn, dispute: DisputeRow, outcome: 'lost' | 'won'): DisputeRow {
  if (dispute.status !== 'needs_response')
    throw refusal(undefined, `Dispute ${dispute.id} is closed already.`)
  const moves =
    outcome === 'won'
      ? [bookMoney(turn, { kind: 'adjustment', amount: dispute.amount, sourceId: dispute.id })]
      : []
  const after: DisputeRow = {
    ...dispute,
    status: outcome,
    balanceTransactionIds: [...dispute.balanceTransactionIds, ...moves],
  }
  turn.draft.put({ table: 'disputes', row: after })
  announce(turn, { type: 'charge.dispute.closed', object: presentDispute(turn, after) })
  return after
}
