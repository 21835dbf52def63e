import { isStaff, type Caller } from '@/server/http/caller'
import { presentPhotos } from '@/server/listings/present-listing'
import { findListingById } from '@/server/listings/listing-store'
import {
  countDecisions,
  findVersion,
  findVersionById,
  type VersionRow,
} from '@/server/listings/version-store'
import { listOwnCategories, listWaiting } from '@/server/moderation/review-store'
import { findPhotos } from '@/server/photos/photo-store'
import { judgeListing } from '@/server/rules/judge-listing'
import { findSeller, type SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'
import type { Review } from '@/shared/contracts/moderation'
import { compareBodies } from '@/shared/domain/listings/compare-bodies'
import { lotTitle } from '@/shared/domain/listings/lot-title'

/** What the version is held against: the one buyers see, or else the one submitted before. */
async function versionBefore(version: VersionRow, liveVersion: number | null): Promise<VersionRow | null> {
  const before = liveVersion !== null && liveVersion < version.number ? liveVersion : version.number - 1
  return before < 1 ? null : findVersion(version.listingId, before)
}

async function sellerOf(seller: SellerRow): Promise<Review['seller']> {
  const decided = await countDecisions(seller.id)
  return {
    farmName: seller.farmName,
    kind: seller.kind,
    state: seller.state,
    since: seller.createdAt.toISOString(),
    approvedBefore: decided.approved,
    rejectedBefore: decided.rejected,
    licences: seller.licences.map(({ state, answer, number }) => ({
      state,
      answer,
      ...(number ? { number } : {}),
    })),
  }
}

/** The rules at the seller's own gate, where the animals change hands. */
async function rulesFor(body: ListingBody, state: string): Promise<Review['rules']> {
  const asked = { body, sellerState: state, buyerState: state, viewer: 'staff', approved: false } as const
  return (await judgeListing(asked)).reasons
}

/** The next to look at, for somebody who goes through the queue by keyboard. */
async function nextAfter(caller: Caller, version: VersionRow): Promise<string | undefined> {
  const except = { memberId: caller.memberId, categories: await listOwnCategories(caller.memberId) }
  const [later] = await listWaiting(except, { after: version, limit: 1 })
  const fromTop = later ? [] : await listWaiting(except, { after: null, limit: 2 })
  const next = later ?? fromTop.find((row) => row.id !== version.id)
  return next ? String(next.id) : undefined
}

/** One version beside the one before it, with everything a decision needs. */
export async function readReview(caller: Caller, versionId: number): Promise<Review> {
  if (!isStaff(caller)) throw new Problem('not-allowed')
  const version = await findVersionById(versionId)
  const listing = version && (await findListingById(version.listingId))
  const seller = listing && (await findSeller(listing.sellerId))
  if (!version || !seller) throw new Problem('not-found')
  const { body } = version
  const [before, photos, shownSeller, rules, nextVersionId] = await Promise.all([
    versionBefore(version, listing.liveVersion),
    findPhotos(body.photos.map((photo) => photo.photoId)),
    sellerOf(seller),
    rulesFor(body, seller.state),
    nextAfter(caller, version),
  ])
  return {
    versionId: String(version.id),
    listingId: listing.publicId,
    listingState: listing.state as Review['listingState'],
    number: version.number,
    title: lotTitle(body),
    review: version.review as Review['review'],
    flags: version.flags,
    submittedAt: version.submittedAt.toISOString(),
    body,
    ...(before ? { before: { number: before.number, body: before.body } } : {}),
    changes: before ? compareBodies(before.body, body) : [],
    photos: presentPhotos(body, photos),
    seller: shownSeller,
    rules,
    ...(nextVersionId ? { nextVersionId } : {}),
  }
}
