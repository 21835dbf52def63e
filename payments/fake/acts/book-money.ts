import type { BalanceTransactionRow } from '../books/rows'
import { newId } from '../ids'
import type { Turn } from '../turn'

const FEE_BP = 290
const FEE_FIXED_CENTS = 30
const HOUR_S = 3600

/** 2.9 % + 30 c, half up, kept when the charge is refunded (US card pricing, from memory). */
export function processingFeeCents(amountCents: number): number {
  return Math.floor((amountCents * FEE_BP + 5000) / 10_000) + FEE_FIXED_CENTS
}

interface Move {
  kind: BalanceTransactionRow['kind']
  /** Signed, from the platform's point of view. */
  amount: number
  fee?: number
  sourceId: string | null
  description?: string
}

/** Writes one move of the platform's money and returns its id. Only card money may be on its way for a while. */
export function bookMoney(turn: Turn, move: Move): string {
  const id = newId('txn')
  const waitS = move.kind === 'charge' ? turn.world.settings.fundsDelayHours * HOUR_S : 0
  turn.draft.put({
    table: 'balanceTransactions',
    row: {
      id,
      createdS: turn.nowS,
      availableOnS: turn.nowS + waitS,
      kind: move.kind,
      amount: move.amount,
      fee: move.fee ?? 0,
      sourceId: move.sourceId,
      description: move.description ?? null,
    },
  })
  return id
}
