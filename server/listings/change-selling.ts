import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { judgeAtHome } from '@/server/listings/judge-at-home'
import { mayListing } from '@/server/listings/listing-policy'
import { lockListing, setListing, type ListingRow } from '@/server/listings/listing-store'
import { readOwnListing } from '@/server/listings/read-own-listing'
import { requireOwnListing } from '@/server/listings/require-own-listing'
import { findVersion } from '@/server/listings/version-store'
import { listOpenWindows } from '@/server/listings/window-store'
import { projectListings } from '@/server/search/project-listings'
import { requirePayouts } from '@/server/sellers/require-payouts'
import type { SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'
import type { OwnListing } from '@/shared/contracts/listings'

type Selling = 'paused' | 'live'

/** Law, licence and payouts may have changed during the pause: all are looked at again. */
async function checkResume(listing: ListingRow, seller: SellerRow): Promise<void> {
  requirePayouts(seller)
  const version = listing.liveVersion === null ? null : await findVersion(listing.id, listing.liveVersion)
  if (!version) throw new Problem('listing-closed')
  await judgeAtHome(version.body, seller.state)
  if ((await listOpenWindows([listing.id], now())).length === 0) {
    throw new Problem(
      'listing-closed',
      'All pickup windows are over: offer a new one, then submit the listing.',
    )
  }
}

export async function changeSelling(caller: Caller, publicId: string, selling: Selling): Promise<OwnListing> {
  const { seller, listing } = await requireOwnListing(caller, publicId)
  const act = selling === 'paused' ? 'pause' : 'resume'
  // Twice the same wish is once done.
  if (listing.state === selling) return readOwnListing(caller, publicId)
  mayListing(act, { ...listing, everSubmitted: true })
  if (act === 'resume') await checkResume(listing, seller)
  await inTransaction(async (tx) => {
    const row = await lockListing(listing.id, tx)
    if (!row) throw new Problem('not-found')
    mayListing(act, { ...row, everSubmitted: true })
    await setListing(row.id, { state: selling, updatedAt: now() }, tx)
    await projectListings(tx, [row.id])
  })
  return readOwnListing(caller, publicId)
}
