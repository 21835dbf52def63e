import { dayOf } from '@/server/listings/day-of'
import { categoryCode } from '@/server/search/category-codes'
import { dayNumber, packOpenDays } from '@/server/search/open-days'
import type { ListingFacts, OpenWindow } from '@/server/search/projection-store'
import { meanRating } from '@/server/ratings/mean-rating'
import { ratingRank } from '@/server/search/rating-rank'
import type { SearchRow, SearchTier } from '@/server/search/search-row'
import { siteMean } from '@/server/search/site-mean'
import type { ListingBody } from '@/shared/contracts/listings'
import { stateBit } from '@/shared/domain/rules/state-bits'
import { laneOfBatch } from '@/shared/domain/season/lane-of-batch'
import { NO_LANE } from '@/shared/domain/season/season-lane'
import { findSpecies } from '@/shared/domain/species/find-species'
import { findTaxon } from '@/shared/domain/species/find-taxon'

/** 0: an animal we hold no care figures for has no code of its own. */
export function speciesCodeOf(taxonId: string): number {
  const speciesId = findTaxon(taxonId)?.speciesId
  return speciesId ? (findSpecies(speciesId)?.speciesCode ?? 0) : 0
}

/** Species are a filter of fish: worms, media and produce are found by their category. */
const NO_SPECIES = 0

/** Prices from the smallest order on; those that only hold below it can never be asked for. */
function tiersFrom(minOrder: number, tiers: readonly SearchTier[]): SearchTier[] {
  const first = tiers.findLastIndex((tier) => tier.fromCount <= minOrder)
  return tiers.slice(Math.max(0, first)).map(({ fromCount, unitCents }) => ({ fromCount, unitCents }))
}

/** How it is shipped, and to which of the states served it may be shown at all. */
function shippingColumns({ body, cellLat, cellLng }: ListingFacts, hiddenStates: bigint) {
  if (body.category !== 'fish' || !body.shipping) return { lane: NO_LANE, shipStates: 0n }
  const from = { lat: cellLat, lng: cellLng }
  const lane = laneOfBatch({ taxonId: body.taxonId, packing: body.shipping.packing, from })
  const served = body.statesServed.reduce((mask, state) => mask | (stateBit(state) ?? 0n), 0n)
  return { lane, shipStates: lane === NO_LANE ? 0n : served & ~hiddenStates }
}

/** Sizes are asked of fish alone: everything else has none in search. */
const sizeColumns = (body: ListingBody) =>
  body.category === 'fish'
    ? { sizeLoMm: Math.round(body.sizeLoMm), sizeHiMm: Math.round(body.sizeHiMm) }
    : { sizeLoMm: 0, sizeHiMm: 0 }

interface Around {
  windows: OpenWindow[]
  hiddenStates: bigint
  rev: number
}

/** What search knows of a listing. null: nothing can be bought of it now. */
export function searchRowOf(facts: ListingFacts, around: Around): SearchRow | null {
  const { body, free } = facts
  const days = packOpenDays(around.windows.map(({ startsAt, zone }) => dayNumber(dayOf(startsAt, zone))))
  if (!days || free < body.minOrder) return null
  return {
    listingId: facts.listingId,
    sellerId: facts.sellerId,
    categoryCode: categoryCode(body.category),
    speciesCode: body.category === 'fish' ? speciesCodeOf(body.taxonId) : NO_SPECIES,
    place: { lat: facts.cellLat, lng: facts.cellLng },
    qty: free,
    minQty: body.minOrder,
    tiers: tiersFrom(body.minOrder, body.tiers),
    ...sizeColumns(body),
    ...days,
    pickup: true,
    ...shippingColumns(facts, around.hiddenStates),
    hiddenStates: around.hiddenStates,
    ratingRank: ratingRank({ mean: meanRating(facts), count: facts.ratingCount }, siteMean()),
    rev: around.rev,
  }
}
