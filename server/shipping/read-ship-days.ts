import { isPublic } from '@/server/listings/listing-policy'
import { readListingRow, readSellerById } from '@/server/orders/party-store'
import { requireOrderSize } from '@/server/orders/require-order-size'
import { readLiveTerms } from '@/server/orders/terms-store'
import { requirePlace } from '@/server/places/find-place'
import { judgeListing } from '@/server/rules/judge-listing'
import { requireShippedTo } from '@/server/shipping/may-ship-to'
import { offerShipDays } from '@/server/shipping/offer-ship-days'
import { firstShipDay } from '@/server/shipping/ship-rule'
import { wayTo } from '@/server/shipping/ship-way'
import { Problem } from '@/shared/api/problem'
import type { ShipDayOffers } from '@/shared/contracts/shipments'

interface Asked {
  listingId: string
  near: string
  quantity: number
}

/** The coming days on which a batch could leave for a place, for anybody who asks. Nothing is held by it. */
export async function readShipDays({ listingId, near, quantity }: Asked): Promise<ShipDayOffers> {
  const place = await requirePlace(near, 'query:near')
  const listing = await readListingRow(listingId)
  if (!listing || listing.liveVersion === null || !isPublic(listing)) throw new Problem('not-found')
  const [seller, live] = await Promise.all([
    readSellerById(listing.sellerId),
    readLiveTerms(listing.id, listing.liveVersion),
  ])
  if (!seller) throw new Problem('not-found')
  const terms = requireShippedTo(live.terms, place.state)
  const verdict = await judgeListing({
    body: terms,
    sellerState: seller.state,
    buyerState: place.state,
    viewer: 'visitor',
  })
  if (verdict.buy === 'no') {
    throw new Problem('species-prohibited', `These animals are not sold to ${place.state}.`)
  }
  const way = wayTo({ terms, quantity, seller }, place)
  requireOrderSize(terms, { quantity, charges: way.charges, pointer: 'query:quantity' })
  return offerShipDays(way, firstShipDay(terms, seller.zone))
}
