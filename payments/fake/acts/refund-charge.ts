import type { ChargeRow, RefundRow } from '../books/rows'
import { badParameter, refusal } from '../failure'
import { newId } from '../ids'
import { platformBalance } from '../objects/balance'
import { presentCharge } from '../objects/charge'
import { presentRefund } from '../objects/refund'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'
import { bookMoney } from './book-money'

interface Wish {
  /** Null: all that is left. */
  cents: number | null
  reason: RefundRow['reason']
  metadata: Record<string, string>
}

function checkRefundable(charge: ChargeRow, cents: number | null): number {
  if (!charge.captured)
    throw refusal(undefined, 'This charge was not captured: cancel its PaymentIntent instead.')
  if (charge.disputed)
    throw refusal('charge_disputed', `Charge ${charge.id} is disputed; the dispute decides.`)
  const left = charge.amountCaptured - charge.amountRefunded
  if (left === 0) throw refusal('charge_already_refunded', `Charge ${charge.id} has already been refunded.`)
  if (cents !== null && cents < 1)
    throw badParameter('amount', 'Invalid positive integer', 'parameter_invalid_integer')
  if (cents !== null && cents > left) {
    throw refusal(
      undefined,
      `Refund amount (${cents} c) is greater than what is left on the charge (${left} c).`,
      {
        param: 'amount',
      },
    )
  }
  return cents ?? left
}

function payOut(turn: Turn, refund: RefundRow): RefundRow {
  const balanceTransactionId = bookMoney(turn, {
    kind: 'refund',
    amount: -refund.amount,
    sourceId: refund.id,
  })
  const paid: RefundRow = { ...refund, status: 'succeeded', balanceTransactionId }
  turn.draft.put({ table: 'refunds', row: paid })
  return paid
}

/**
 * Back to the card it came from, never more than is left. Waits as `pending` while the platform's balance is too
 * small (docs.stripe.com, refunds: pending_reason insufficient_funds).
 */
export function refundCharge(turn: Turn, charge: ChargeRow, wish: Wish): RefundRow {
  const amount = checkRefundable(charge, wish.cents)
  const asked: RefundRow = {
    id: newId('re'),
    createdS: turn.nowS,
    chargeId: charge.id,
    paymentId: charge.paymentId,
    amount,
    status: 'pending',
    reason: wish.reason,
    metadata: wish.metadata,
    balanceTransactionId: null,
  }
  turn.draft.put({ table: 'refunds', row: asked })
  const after = { ...charge, amountRefunded: charge.amountRefunded + amount }
  turn.draft.put({ table: 'charges', row: after })
  const refund = platformBalance(turn).availableCents >= amount ? payOut(turn, asked) : asked
  announce(turn, { type: 'charge.refunded', object: presentCharge(turn, after) })
  return refund
}

export function settlePendingRefunds(turn: Turn): void {
  for (const refund of turn.draft.all('refunds')) {
    if (refund.status !== 'pending' || platformBalance(turn).availableCents < refund.amount) continue
    announce(turn, { type: 'refund.updated', object: presentRefund(turn, payOut(turn, refund)) })
  }
}
