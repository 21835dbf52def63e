import { now } from '@/server/clock'
import { findListing } from '@/server/listings/listing-store'
import { seasonWeek } from '@/server/listings/season-week'
import { requirePlace, type FoundPlace } from '@/server/places/find-place'
import { listOnSale, type OnSaleRow } from '@/server/search/on-sale-store'
import { presentFound, presentPlaceless } from '@/server/search/present-found'
import { findSellerByPublicId, type SellerRow } from '@/server/sellers/seller-store'
import { readCursor, writeCursor } from '@/shared/api/cursor'
import type { ParsedQuery, ReplyOf } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'
import type { Endpoints } from '@/shared/api/routes.gen'
import { distanceKm } from '@/shared/domain/geo/distance'
import { tierFor } from '@/shared/domain/money/tier-price'

type Asked = ParsedQuery<Endpoints['listSellerListings']>

/** Cursors carry the public name of the last listing shown, and only one of this very seller. */
async function idBefore(cursor: string, seller: SellerRow): Promise<number> {
  const { id } = readCursor(cursor)
  const last = typeof id === 'string' ? await findListing(id) : null
  if (!last || last.sellerId !== seller.id) throw new Problem('cursor-unreadable')
  return last.id
}

/** The dearest price, that of the smallest order. */
const priceOf = ({ listingId, body }: OnSaleRow) => ({
  listingId,
  unitCents: tierFor(body.tiers, body.minOrder)?.unitCents ?? 0,
})

async function tagsOf(rows: OnSaleRow[], seller: SellerRow, place: FoundPlace | null) {
  const at = now()
  const priced = rows.map(priceOf)
  if (!place) return presentPlaceless(priced, at)
  // Between cell centres, like every distance that leaves the house.
  const km = distanceKm(place.centre, { lat: seller.cellLat, lng: seller.cellLng })
  return presentFound(
    priced.map((hit) => ({ ...hit, distanceKm: km })),
    { place, destination: place, when: seasonWeek(at), at },
  )
}

/** What a seller has on sale now, as tags, newest first. */
export async function listSellerListings(
  sellerId: string,
  asked: Asked,
): Promise<ReplyOf<Endpoints['listSellerListings']>> {
  const place = asked.near ? await requirePlace(asked.near, 'query:near') : null
  const seller = await findSellerByPublicId(sellerId)
  if (!seller) throw new Problem('not-found')
  const beforeId = asked.cursor ? await idBefore(asked.cursor, seller) : undefined
  const rows = await listOnSale(seller.id, { buyerState: place?.state, beforeId, limit: asked.limit + 1 })
  const items = await tagsOf(rows.slice(0, asked.limit), seller, place)
  const last = rows.length > asked.limit ? items.at(-1) : undefined
  return { items, ...(last ? { nextCursor: writeCursor({ id: last.listingId }) } : {}) }
}
