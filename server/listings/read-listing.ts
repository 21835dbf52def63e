import { now } from '@/server/clock'
import { isStaff, type Caller } from '@/server/http/caller'
import { isPublic } from '@/server/listings/listing-policy'
import { findListing, type ListingRow } from '@/server/listings/listing-store'
import { presentListing } from '@/server/listings/present-listing'
import { findVersion } from '@/server/listings/version-store'
import { listOpenWindows } from '@/server/listings/window-store'
import { findPhotos } from '@/server/photos/photo-store'
import { requirePlace } from '@/server/places/find-place'
import { judgeListing } from '@/server/rules/judge-listing'
import { countOnSale } from '@/server/search/on-sale-store'
import { findSeller, type SellerRow } from '@/server/sellers/seller-store'
import { Problem } from '@/shared/api/problem'
import type { ShownListing } from '@/shared/contracts/listings'
import type { GateVerdict } from '@/shared/contracts/rules'

function actsOn(
  { listing, seller, gate }: { listing: ListingRow; seller: SellerRow; gate: GateVerdict | null },
  caller: Caller | null,
): ShownListing['may'] {
  const isOwn = caller?.memberId === seller.memberId
  const isOpen = listing.state === 'live' && seller.chargesEnabled
  const isRefused = gate !== null && (gate.buy === 'no' || gate.buy === 'ask-moderators')
  return [
    ...(!isOwn && isOpen && !isRefused ? (['reserve'] as const) : []),
    // A visitor is shown the way as well: they sign in first.
    ...(isOwn ? (['edit'] as const) : (['report'] as const)),
    ...(caller && isStaff(caller) ? (['review'] as const) : []),
  ]
}

/**
 * One listing as anybody may read it. Where it may not be sold to, the facts still stand there, with the rule and its
 * source instead of a way to buy. Hidden, refused and unknown listings are the same 404.
 */
export async function readListing(
  caller: Caller | null,
  publicId: string,
  near: string | undefined,
): Promise<ShownListing> {
  const place = near ? await requirePlace(near, 'query:near') : null
  const listing = await findListing(publicId)
  if (!listing || !isPublic(listing)) throw new Problem('not-found')
  const [version, seller] = await Promise.all([
    findVersion(listing.id, listing.liveVersion ?? 0),
    findSeller(listing.sellerId),
  ])
  if (!version || !seller) throw new Problem('not-found')
  const { body } = version
  const viewer = caller?.memberId === seller.memberId ? 'seller' : caller ? 'buyer' : 'visitor'
  const [windows, photos, gate, alsoOnSale] = await Promise.all([
    listOpenWindows([listing.id], now()),
    findPhotos(body.photos.map((photo) => photo.photoId)),
    place && judgeListing({ body, sellerState: seller.state, buyerState: place.state, viewer }),
    countOnSale(seller.id, { buyerState: place?.state, exceptId: listing.id }),
  ])
  const may = actsOn({ listing, seller, gate }, caller)
  return presentListing({
    listing,
    version,
    seller,
    windows,
    photos,
    place,
    gate,
    alsoOnSale,
    may,
    at: now(),
  })
}
