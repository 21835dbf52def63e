import type { Tx } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { findSellerOf, type SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'

/** The farm of the member who asks. A seller's role without a farm (given by hand) sells nothing yet. */
export async function requireSeller(caller: Caller, tx?: Tx): Promise<SellerRow> {
  const found = await findSellerOf(caller.memberId, tx)
  if (!found) throw new Problem('not-found', 'Tell us about your farm first, under Sell.')
  return found
}
