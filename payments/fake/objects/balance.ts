import type Stripe from 'stripe'
import type { AccountRow } from '../books/rows'
import type { Turn } from '../turn'

/** The platform's money at the processor: what may be used now, and what is still on its way. */
export function platformBalance(turn: Turn): { availableCents: number; pendingCents: number } {
  let availableCents = 0
  let pendingCents = 0
  for (const row of turn.draft.all('balanceTransactions')) {
    if (row.availableOnS <= turn.nowS) availableCents += row.amount - row.fee
    else pendingCents += row.amount - row.fee
  }
  return { availableCents, pendingCents }
}

export function presentBalance(turn: Turn, account: AccountRow | null): Stripe.Balance {
  const { availableCents, pendingCents } = account
    ? { availableCents: account.balance, pendingCents: 0 }
    : platformBalance(turn)
  return {
    object: 'balance',
    available: [{ amount: availableCents, currency: 'usd', source_types: { card: availableCents } }],
    livemode: false,
    pending: [{ amount: pendingCents, currency: 'usd', source_types: { card: pendingCents } }],
  }
}
