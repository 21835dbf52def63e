import { inTransaction } from '@/db/transaction'
import { meanRating } from '@/server/ratings/mean-rating'
import { projectListings } from '@/server/search/project-listings'
import { setSiteMean, siteMeanOf } from '@/server/search/site-mean'
import { listRatedListings, sumAllRatings } from '@/server/search/site-mean-store'

const MOST_AT_ONCE = 200

/**
 * Follows the mean of all ratings; when it has moved by a tenth, the listings of all rated sellers are ranked anew,
 * some at a time. Returns how many were.
 */
export async function refreshSiteMean(): Promise<number> {
  const all = await sumAllRatings()
  if (!setSiteMean(siteMeanOf({ count: all.ratingCount, mean: meanRating(all) }))) return 0
  let ranked = 0
  for (let after = 0; ;) {
    const ids = await listRatedListings(after, MOST_AT_ONCE)
    const last = ids.at(-1)
    if (last === undefined) return ranked
    await inTransaction((tx) => projectListings(tx, ids))
    ranked += ids.length
    after = last
  }
}
