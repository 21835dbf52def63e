import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { isPublic } from '@/server/listings/listing-policy'
import { readListingRow, readSellerById, type SellerRow } from '@/server/orders/party-store'
import { shortOf } from '@/server/orders/short-of'
import { readLiveTerms } from '@/server/orders/terms-store'
import type { ReserveAsked } from '@/server/orders/reserve-batch'
import { requireOrderSize } from '@/server/orders/require-order-size'
import { Problem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'

export interface CheckedReservation {
  listing: NonNullable<Awaited<ReturnType<typeof readListingRow>>>
  seller: SellerRow
  versionId: number
  terms: ListingBody
}

function checkQuantity(terms: ListingBody, quantity: number): void {
  const { minOrder, orderStep, mostPerBuyer } = terms
  const refuse = (detail: string) =>
    new Problem('fields-invalid', undefined, { errors: [{ detail, pointer: '#/quantity' }] })
  if (quantity < minOrder) {
    throw new Problem('below-minimum', `The smallest order here is ${minOrder}.`, { facts: { minOrder } })
  }
  if ((quantity - minOrder) % orderStep !== 0) {
    throw refuse(`From ${minOrder} on in steps of ${orderStep}.`)
  }
  if (mostPerBuyer !== undefined && quantity > mostPerBuyer)
    throw refuse(`At most ${mostPerBuyer} for one buyer.`)
  requireOrderSize(terms, { quantity, pointer: '#/quantity' })
}

/** What can be said no to before anything is held: who, what, how many, under which terms. */
export async function checkReservation(
  caller: Caller,
  listingId: string,
  asked: ReserveAsked,
): Promise<CheckedReservation> {
  const listing = await readListingRow(listingId)
  if (!listing || listing.liveVersion === null || !isPublic(listing)) throw new Problem('not-found')
  const seller = await readSellerById(listing.sellerId)
  if (!seller) throw new Problem('not-found')
  if (seller.memberId === caller.memberId) throw new Problem('own-batch', 'You cannot buy from yourself.')
  if (listing.state !== 'live')
    throw new Problem('listing-closed', 'The seller is not selling from this listing now.')
  if (!seller.chargesEnabled) {
    throw new Problem(
      'seller-unready',
      'The seller is finishing paperwork with the payment processor. Try again later.',
    )
  }
  const live = await readLiveTerms(listing.id, listing.liveVersion)
  if (live.number !== asked.version) {
    throw new Problem(
      'version-stale',
      'The seller has just changed this listing. Look at it again before you pay.',
    )
  }
  if (
    live.terms.category === 'fish' &&
    live.terms.hatchedOn > now().toISOString().slice(0, 10) &&
    !live.terms.readyOn
  ) {
    throw new Problem('listing-closed', 'This batch has no promised ready date yet.')
  }
  checkQuantity(live.terms, asked.quantity)
  // Most losers of a rush are told here, without queueing for the row that the winners write.
  if (listing.free < asked.quantity) throw shortOf(listing.free)
  return { listing, seller, versionId: live.versionId, terms: live.terms }
}
