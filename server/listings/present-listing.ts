import { describeListing, photoAlt } from '@/server/listings/describe-listing'
import type { ListingRow } from '@/server/listings/listing-store'
import { presentShippedThroughYear } from '@/server/listings/present-shipped'
import { presentWindow } from '@/server/listings/present-window'
import { seasonWeek } from '@/server/listings/season-week'
import type { VersionRow } from '@/server/listings/version-store'
import type { WindowRow } from '@/server/listings/window-store'
import type { PhotoRow } from '@/server/photos/photo-store'
import type { FoundPlace } from '@/server/places/find-place'
import { presentSellerCard } from '@/server/sellers/present-seller-card'
import type { SellerRow } from '@/server/sellers/seller-store'
import type { ListingBody, ShownListing } from '@/shared/contracts/listings'
import type { GateVerdict } from '@/shared/contracts/rules'
import { bearingWords } from '@/shared/domain/geo/bearing-words'
import { distanceKm } from '@/shared/domain/geo/distance'

export interface ListingPage {
  listing: ListingRow
  version: VersionRow
  seller: SellerRow
  windows: WindowRow[]
  photos: PhotoRow[]
  place: FoundPlace | null
  gate: GateVerdict | null
  alsoOnSale: number
  may: ShownListing['may']
  at: Date
}

/** The pictures of a body in its order; one whose file is gone is left out. */
export function presentPhotos(body: ListingBody, photos: PhotoRow[]): ShownListing['photos'] {
  return body.photos.flatMap(({ photoId }, at) => {
    const row = photos.find((photo) => photo.id === photoId)
    if (!row) return []
    const { widthPx, heightPx, ground } = row
    return [{ photoId, widthPx, heightPx, ground, alt: photoAlt(body, at) }]
  })
}

function wayTo(to: FoundPlace, { version, seller, gate, at }: ListingPage) {
  const from = { lat: seller.cellLat, lng: seller.cellLng }
  return { body: version.body, from, to, status: gate?.status ?? 'unknown', when: seasonWeek(at) }
}

/** The public page. Place and distance run between cell centres; nothing on it depends on the true point. */
export function presentListing(page: ListingPage): ShownListing {
  const { listing, version, seller, place } = page
  const here = { lat: seller.cellLat, lng: seller.cellLng }
  const shipped = place && presentShippedThroughYear(wayTo(place, page))
  const bearing = place ? bearingWords(place.centre, here) : null
  return {
    listingId: listing.publicId,
    state: listing.state as ShownListing['state'],
    title: describeListing(version.body).title,
    body: version.body,
    version: version.number,
    free: listing.free,
    seller: presentSellerCard(seller),
    ...(place ? { distanceKm: distanceKm(place.centre, here) } : {}),
    ...(bearing ? { bearing } : {}),
    ...here,
    windows: page.windows.map(presentWindow),
    ...(page.gate ? { gate: page.gate } : {}),
    ...(shipped ? { shipped } : {}),
    photos: presentPhotos(version.body, page.photos),
    alsoOnSale: page.alsoOnSale,
    may: page.may,
  }
}
