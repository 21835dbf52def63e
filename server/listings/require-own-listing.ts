import type { Tx } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { findListing, type ListingRow } from '@/server/listings/listing-store'
import { requireSeller } from '@/server/sellers/require-seller'
import type { SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'

/** The seller's own listing; another seller's is answered like one that does not exist. */
export async function requireOwnListing(
  caller: Caller,
  publicId: string,
  tx?: Tx,
): Promise<{ seller: SellerRow; listing: ListingRow }> {
  const seller = await requireSeller(caller, tx)
  const listing = await findListing(publicId, tx)
  if (!listing || listing.sellerId !== seller.id) throw new Problem('not-found')
  return { seller, listing }
}
