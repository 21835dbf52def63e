import type { AccountRow } from '../books/rows'
import { presentAccount } from '../objects/account'
import type { Turn } from '../turn'
import { announce } from '../webhooks/announce'

export function changeAccount(turn: Turn, account: AccountRow, change: Partial<AccountRow>): AccountRow {
  const after = { ...account, ...change }
  turn.draft.put({ table: 'accounts', row: after })
  announce(turn, { type: 'account.updated', object: presentAccount(turn, after), accountId: after.id })
  return after
}

/** What the onboarding page leaves behind: everything in order, or nothing submitted yet. */
export function finishOnboarding(turn: Turn, account: AccountRow): AccountRow {
  return changeAccount(turn, account, { detailsSubmitted: true, chargesEnabled: true, payoutsEnabled: true })
}
