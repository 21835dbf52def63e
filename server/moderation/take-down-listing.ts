import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { countOpenOrders, setListing, type ListingRow } from '@/server/listings/listing-store'
import { findVersion, supersedeWaiting } from '@/server/listings/version-store'
import { takenDownMail } from '@/server/mail/letters/listing-taken-down'
import { findMember } from '@/server/members/member-store'
import { writeAudit } from '@/server/moderation/audit-store'
import { closeReports } from '@/server/moderation/report-store'
import { withReported } from '@/server/moderation/with-reported'
import { tellMember } from '@/server/notices/tell-member'
import { orderSettings } from '@/server/orders/order-settings'
import { projectListings } from '@/server/search/project-listings'
import type { SellerRow } from '@/server/sellers/seller-store'
import type { ParsedBody, ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import { lotTitle } from '@/shared/domain/listings/lot-title'

type Given = ParsedBody<Endpoints['takeDownListing']>

/** The seller learns what the moderator says, nothing of who reported or in which words. */
async function tellSeller(
  { listing, seller, given }: { listing: ListingRow; seller: SellerRow; given: Given },
  tx: Tx,
): Promise<void> {
  const [member, version, orders] = await Promise.all([
    findMember(seller.memberId, tx),
    findVersion(listing.id, listing.liveVersion ?? 0, tx),
    countOpenOrders([listing.id], tx),
  ])
  if (!member || !version) return
  const title = lotTitle(version.body)
  await tellMember(tx, {
    memberId: seller.memberId,
    kind: 'listing-taken-down',
    cause: `taken-down:${listing.id}`,
    about: { listingId: listing.id },
    title,
    letter: takenDownMail({
      to: { name: member.name, email: member.email },
      origin: orderSettings().origin,
      title,
      openOrders: orders.get(listing.id) ?? 0,
      ...given,
    }),
  })
}

/**
 * Takes a reported listing off sale for good: out of search, its page gone, a version that waits with it, all in one
 * transaction. Orders that were made from it are not touched.
 */
export async function takeDownListing(
  caller: Caller,
  publicId: string,
  given: Given,
): Promise<ReplyOf<Endpoints['takeDownListing']>> {
  return withReported(caller, publicId, async ({ listing, seller }, tx) => {
    const { reason, note } = given
    const at = now()
    await setListing(listing.id, { state: 'taken_down', updatedAt: at }, tx)
    await supersedeWaiting(listing.id, at, tx)
    await projectListings(tx, [listing.id])
    const closing = { outcome: 'taken-down', closingReason: reason, note: note || null } as const
    const closed = await closeReports(listing.id, { ...closing, closedBy: caller.memberId, closedAt: at }, tx)
    await writeAudit(
      {
        actorId: caller.memberId,
        act: 'listing-taken-down',
        subject: `listing:${listing.id}`,
        facts: { reason, note: note || null, reports: closed, stateBefore: listing.state },
        at,
      },
      tx,
    )
    await tellSeller({ listing, seller, given }, tx)
    return { listingId: listing.publicId, state: 'taken_down', closed }
  })
}
