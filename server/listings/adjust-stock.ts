import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { changeFree, hasMoved, hasStock } from '@/server/listings/batch-stock-store'
import { findListingById } from '@/server/listings/listing-store'
import { readOwnListing } from '@/server/listings/read-own-listing'
import { requireOwnListing } from '@/server/listings/require-own-listing'
import { projectListings } from '@/server/search/project-listings'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { adjustStock as adjustStockCall, OwnListing } from '@/shared/contracts/listings'

export type StockAdjustment = ParsedBody<typeof adjustStockCall> & { commandId: string }

/** Corrects the free count with a reason. What buyers hold is not the seller's to take: those orders are asked first. */
export async function adjustStock(
  caller: Caller,
  publicId: string,
  given: StockAdjustment,
): Promise<OwnListing> {
  const { listing } = await requireOwnListing(caller, publicId)
  const { change, reason, note, commandId } = given
  await inTransaction(async (tx) => {
    if (await hasMoved(listing.id, commandId, tx)) return
    if (!(await hasStock(listing.id, tx))) {
      throw new Problem('listing-closed', 'This batch is not on sale yet: change the count in the form.')
    }
    const move = { listingId: listing.id, change, reason, by: caller.memberId, commandId, at: now() }
    if (!(await changeFree({ ...move, ...(note ? { note } : {}) }, tx))) {
      const left = (await findListingById(listing.id, tx))?.free ?? 0
      throw new Problem(
        'batch-short',
        `Only ${left} are free; the rest is held or sold. Take away at most ${left}, and settle the others with their buyers.`,
        { facts: { left } },
      )
    }
    await projectListings(tx, [listing.id])
  })
  return readOwnListing(caller, publicId)
}
