import { dayOf } from '@/server/listings/day-of'
import { categoryCode } from '@/server/search/category-codes'
import { dayNumber, packOpenDays } from '@/server/search/open-days'
import type { ListingFacts, OpenWindow } from '@/server/search/projection-store'
import { meanRating } from '@/server/ratings/mean-rating'
import { ratingRank } from '@/server/search/rating-rank'
import { NO_LANE, type SearchRow, type SearchTier } from '@/server/search/search-row'
import { siteMean } from '@/server/search/site-mean'
import { findSpecies } from '@/shared/domain/species/find-species'
import { findTaxon } from '@/shared/domain/species/find-taxon'

/** 0: an animal we hold no care figures for has no code of its own. */
export function speciesCodeOf(taxonId: string): number {
  const speciesId = findTaxon(taxonId)?.speciesId
  return speciesId ? (findSpecies(speciesId)?.speciesCode ?? 0) : 0
}

/** Prices from the smallest order on; those that only hold below it can never be asked for. */
function tiersFrom(minOrder: number, tiers: readonly SearchTier[]): SearchTier[] {
  const first = tiers.findLastIndex((tier) => tier.fromCount <= minOrder)
  return tiers.slice(Math.max(0, first)).map(({ fromCount, unitCents }) => ({ fromCount, unitCents }))
}

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
    speciesCode: speciesCodeOf(body.taxonId),
    place: { lat: facts.cellLat, lng: facts.cellLng },
    qty: free,
    minQty: body.minOrder,
    tiers: tiersFrom(body.minOrder, body.tiers),
    sizeLoMm: Math.round(body.sizeLoMm),
    sizeHiMm: Math.round(body.sizeHiMm),
    ...days,
    pickup: true,
    lane: NO_LANE,
    hiddenStates: around.hiddenStates,
    ratingRank: ratingRank({ mean: meanRating(facts), count: facts.ratingCount }, siteMean()),
    rev: around.rev,
  }
}
