import type { Tx } from '@/db/transaction'
import { applyWindows } from '@/server/listings/apply-windows'
import { changeFree, hasStock } from '@/server/listings/batch-stock-store'
import { dayOf } from '@/server/listings/day-of'
import { setListing, type ListingRow } from '@/server/listings/listing-store'
import type { VersionRow } from '@/server/listings/version-store'
import { listOpenWindows } from '@/server/listings/window-store'
import { projectListings } from '@/server/search/project-listings'

export interface Publication {
  listing: ListingRow
  version: Pick<VersionRow, 'number' | 'body'>
  zone: string
  /** Who makes it public: the seller, or the moderator who approves. */
  by: string
  at: Date
}

/**
 * Makes a version the one that buyers see: windows, the first count of the batch, and search, all in the caller's
 * transaction. A seller's pause stays a pause; without a pickup window to come there is nothing to sell.
 */
export async function publishVersion({ listing, version, zone, by, at }: Publication, tx: Tx): Promise<void> {
  const { number, body } = version
  await applyWindows({ listingId: listing.id, body, zone, at }, tx)
  if (!(await hasStock(listing.id, tx))) {
    const first = { listingId: listing.id, change: body.countOnHand, reason: 'published', by, at }
    await changeFree({ ...first, commandId: 'published' }, tx)
  }
  const last = (await listOpenWindows([listing.id], at, tx)).at(-1)
  const state = listing.state === 'paused' ? 'paused' : last ? 'live' : 'expired'
  await setListing(
    listing.id,
    {
      liveVersion: number,
      state,
      category: body.category,
      expiresOn: last ? dayOf(last.startsAt, last.zone) : null,
      updatedAt: at,
    },
    tx,
  )
  await projectListings(tx, [listing.id])
}
