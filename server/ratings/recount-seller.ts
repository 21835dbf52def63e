import type { Tx } from '@/db/transaction'
import { listLiveListingIds, recountRatings } from '@/server/ratings/rating-store'
import { projectListings } from '@/server/search/project-listings'

/** Brings a seller's record and the place of their listings in search in step with a changed rating. */
export async function recountSeller(tx: Tx, sellerId: number): Promise<void> {
  await recountRatings(tx, sellerId)
  await projectListings(tx, await listLiveListingIds(tx, sellerId))
}
