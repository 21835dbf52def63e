import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { limitCalls } from '@/server/http/call-limit'
import type { Caller } from '@/server/http/caller'
import { isPublic } from '@/server/listings/listing-policy'
import { findListing, lockListing } from '@/server/listings/listing-store'
import { presentReport } from '@/server/moderation/present-report'
import { findOpenReport, insertReport } from '@/server/moderation/report-store'
import { findSeller } from '@/server/sellers/seller-store'
import type { ParsedBody } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'
import type { MadeReport, reportListing as reportListingCall } from '@/shared/contracts/listing-reports'

const LIMIT = { name: 'report', windowS: 86_400, most: 5 } as const

/**
 * Keeps what a member says is wrong with a listing. While their report waits, a second one changes nothing and gets
 * the first as its answer; only what is kept counts against the five of a day.
 */
export async function reportListing(
  caller: Caller,
  publicId: string,
  given: ParsedBody<typeof reportListingCall>,
): Promise<MadeReport> {
  const found = await findListing(publicId)
  if (!found || !isPublic(found)) throw new Problem('not-found')
  const seller = await findSeller(found.sellerId)
  if (seller?.memberId === caller.memberId) {
    throw new Problem(
      'own-batch',
      'This is your own listing: change it or pause it under Sell. Nobody needs to report it.',
    )
  }
  const mine = { listingId: found.id, reporterId: caller.memberId }
  const before = await findOpenReport(mine)
  if (before) return presentReport(before)
  await limitCalls(LIMIT, caller.memberId)
  return inTransaction(async (tx) => {
    // Locked, so that two presses at once make one report and none lands on a listing just taken down.
    const listing = await lockListing(found.id, tx)
    if (!listing || !isPublic(listing)) throw new Problem('not-found')
    const meanwhile = await findOpenReport(mine, tx)
    if (meanwhile) return presentReport(meanwhile)
    const row = { ...mine, reason: given.reason, words: given.words || null, createdAt: now() }
    await insertReport(row, tx)
    return presentReport(row)
  })
}
