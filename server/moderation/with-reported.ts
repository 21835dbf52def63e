import { inTransaction, type Tx } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { findListing, lockListing, type ListingRow } from '@/server/listings/listing-store'
import { readNewestAt } from '@/server/moderation/report-store'
import { requireImpartial } from '@/server/moderation/review-policy'
import { listOwnCategories } from '@/server/moderation/review-store'
import { findSeller, type SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'

interface Reported {
  listing: ListingRow
  seller: SellerRow
  newestAt: Date
}

/**
 * Decides on a listing with open reports in one transaction, kept from others until it ends. What this moderator has a
 * stake in is refused; what another closed meanwhile is a 409.
 */
export async function withReported<T>(
  caller: Caller,
  publicId: string,
  decide: (reported: Reported, tx: Tx) => Promise<T>,
): Promise<T> {
  const found = await findListing(publicId)
  if (!found) throw new Problem('not-found')
  return inTransaction(async (tx) => {
    // The lock is the first thing read, so that everything after it is as the last decision left it.
    const listing = await lockListing(found.id, tx)
    const seller = listing && (await findSeller(listing.sellerId, tx))
    if (!listing || !seller) throw new Problem('not-found')
    requireImpartial({
      moderatorId: caller.memberId,
      sellerMemberId: seller.memberId,
      category: listing.category,
      ownCategories: await listOwnCategories(caller.memberId, tx),
    })
    const newestAt = await readNewestAt(listing.id, tx)
    if (!newestAt) {
      throw new Problem(
        'version-stale',
        'The reports of this listing were decided meanwhile. Load the list again.',
      )
    }
    return decide({ listing, seller, newestAt }, tx)
  })
}
