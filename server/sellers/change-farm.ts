import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { listListingIdsOf, pauseListingsOf } from '@/server/listings/listing-store'
import { projectListings } from '@/server/search/project-listings'
import { checkLicences } from '@/server/sellers/check-licences'
import { placeFarm } from '@/server/sellers/place-farm'
import { presentOwnSeller } from '@/server/sellers/present-own-seller'
import { requireSeller } from '@/server/sellers/require-seller'
import { updateSeller } from '@/server/sellers/seller-store'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { openFarm, OwnSeller } from '@/shared/contracts/sellers'

export type Farm = ParsedBody<typeof openFarm>

/**
 * Keeps the farm's record and moves its listings along in the same transaction. Another state has other rules:
 * whatever was live is paused, and is judged again when the seller takes it up.
 */
export async function changeFarm(caller: Caller, given: Farm): Promise<OwnSeller> {
  checkLicences(given.licences, given.state)
  const before = await requireSeller(caller)
  const place = await placeFarm(given)
  const at = now()
  const row = await inTransaction(async (tx) => {
    await updateSeller(before.id, { ...given, ...place, updatedAt: at }, tx)
    if (given.state !== before.state) await pauseListingsOf(before.id, at, tx)
    await projectListings(tx, await listListingIdsOf(before.id, tx))
    return requireSeller(caller, tx)
  })
  return presentOwnSeller(row)
}
