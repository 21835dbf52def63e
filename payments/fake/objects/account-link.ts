import type Stripe from 'stripe'
import type { AccountLinkRow } from '../books/rows'
import type { Turn } from '../turn'

export function presentAccountLink(turn: Turn, row: AccountLinkRow): Stripe.AccountLink {
  return {
    object: 'account_link',
    created: row.createdS,
    expires_at: row.expiresAtS,
    url: `${turn.world.origin}/onboard/${row.id}`,
  }
}
