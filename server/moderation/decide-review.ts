import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { lockListing, setListing, type ListingRow } from '@/server/listings/listing-store'
import { publishVersion } from '@/server/listings/publish-version'
import { findVersionById, lockVersion, setVersion, type VersionRow } from '@/server/listings/version-store'
import { reviewMail } from '@/server/mail/letters/review-decided'
import { findMember } from '@/server/members/member-store'
import { writeAudit } from '@/server/moderation/audit-store'
import { readReview } from '@/server/moderation/read-review'
import { closeReports } from '@/server/moderation/report-store'
import { requireImpartial } from '@/server/moderation/review-policy'
import { listOwnCategories } from '@/server/moderation/review-store'
import { tellMember } from '@/server/notices/tell-member'
import { orderSettings } from '@/server/orders/order-settings'
import { projectListings } from '@/server/search/project-listings'
import { findSeller, type SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { decideReview as decideReviewCall, Review } from '@/shared/contracts/moderation'
import { lotTitle } from '@/shared/domain/listings/lot-title'

type Decision = ParsedBody<typeof decideReviewCall>

interface Deciding {
  caller: Caller
  given: Decision
  version: VersionRow
  listing: ListingRow
  seller: SellerRow
  at: Date
}

const NOTICES = { approve: 'listing-approved', ask: 'listing-asked', reject: 'listing-rejected' } as const
const REVIEWS = { approve: 'approved', ask: 'asked', reject: 'rejected' } as const
/** Said of the animals themselves: an approved earlier version does not stay on sale beside that. */
const ENDS_ALL: Decision['reason'][] = ['species-blocked', 'wild-caught']

/** Where the listing stands after a question or a refusal. A version that waited beside the approved one only falls. */
function stateAfter({ given, listing }: Deciding): string {
  const endsAll = given.decision === 'reject' && ENDS_ALL.includes(given.reason)
  if (endsAll) return 'taken_down'
  if (listing.state !== 'pending_review') return listing.state
  return given.decision === 'ask' ? 'draft' : 'taken_down'
}

async function apply(deciding: Deciding, tx: Tx): Promise<void> {
  const { caller, given, version, listing, seller, at } = deciding
  await setVersion(
    version.id,
    {
      review: REVIEWS[given.decision],
      decidedAt: at,
      decidedBy: caller.memberId,
      reasonCode: given.decision === 'approve' ? null : (given.reason ?? null),
      reasonText: given.note ?? null,
    },
    tx,
  )
  if (given.decision === 'approve') {
    await publishVersion({ listing, version, zone: seller.zone, by: caller.memberId, at }, tx)
    return
  }
  const state = stateAfter(deciding)
  await setListing(listing.id, { state, updatedAt: at }, tx)
  if (state === 'taken_down') {
    // What was reported of it is answered with it: the desk does not ask a second time.
    const closing = {
      outcome: 'taken-down',
      closingReason: given.reason ?? null,
      note: given.note ?? null,
    } as const
    await closeReports(listing.id, { ...closing, closedBy: caller.memberId, closedAt: at }, tx)
  }
  await projectListings(tx, [listing.id])
}

async function tellSeller({ given, version, listing, seller }: Deciding, tx: Tx): Promise<void> {
  const member = await findMember(seller.memberId, tx)
  if (!member) return
  const told = {
    to: { name: member.name, email: member.email },
    origin: orderSettings().origin,
    listingId: listing.publicId,
    title: lotTitle(version.body),
    ...given,
  }
  await tellMember(tx, {
    memberId: seller.memberId,
    kind: NOTICES[given.decision],
    cause: `review:${version.id}`,
    about: { listingId: listing.id },
    title: told.title,
    letter: reviewMail(told),
  })
}

/**
 * Approves, asks or rejects one waiting version. What was decided meanwhile, by somebody else or through a newer
 * submission, is a 409: the moderator looks again.
 */
export async function decideReview(caller: Caller, versionId: number, given: Decision): Promise<Review> {
  const [ownCategories, asked] = await Promise.all([
    listOwnCategories(caller.memberId),
    findVersionById(versionId),
  ])
  if (!asked) throw new Problem('not-found')
  await inTransaction(async (tx) => {
    // The listing first, as every submission does: so nobody waits in a circle.
    const listing = await lockListing(asked.listingId, tx)
    const version = await lockVersion(versionId, tx)
    const seller = listing && (await findSeller(listing.sellerId, tx))
    if (!version || !seller) throw new Problem('not-found')
    const { category } = version.body
    requireImpartial({
      moderatorId: caller.memberId,
      sellerMemberId: seller.memberId,
      category,
      ownCategories,
    })
    if (version.review !== 'waiting') {
      throw new Problem('version-stale', 'This version was decided or replaced meanwhile. Load it again.', {
        facts: { review: version.review },
      })
    }
    const deciding = { caller, given, version, listing, seller, at: now() }
    await apply(deciding, tx)
    await writeAudit(
      {
        actorId: caller.memberId,
        act: `listing-${REVIEWS[given.decision]}`,
        subject: `listing:${listing.id}`,
        facts: {
          version: version.number,
          flags: version.flags,
          reason: given.reason ?? null,
          note: given.note ?? null,
        },
        at: deciding.at,
      },
      tx,
    )
    await tellSeller(deciding, tx)
  })
  return readReview(caller, versionId)
}
