import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { lockListing, setListing } from '@/server/listings/listing-store'
import { listBegunListings, listOpenWindows } from '@/server/listings/window-store'
import { projectListings } from '@/server/search/project-listings'

let sweptUntil = new Date(0)

async function follow(listingId: number, at: Date): Promise<void> {
  await inTransaction(async (tx) => {
    const row = await lockListing(listingId, tx)
    if (row?.state !== 'live') return
    const isOver = (await listOpenWindows([listingId], at, tx)).length === 0
    if (isOver) await setListing(listingId, { state: 'expired', updatedAt: at }, tx)
    await projectListings(tx, [listingId])
  })
}

/**
 * Follows the pickup windows that began since the last run: search shows the next one, and a listing whose last one
 * is over has expired. The first run of a process looks at all of them. Returns how many listings it looked at.
 */
export async function expireListings(): Promise<number> {
  const at = now()
  const ids = await listBegunListings(sweptUntil, at)
  for (const id of ids) await follow(id, at)
  sweptUntil = at
  return ids.length
}
