import { earthPoint } from '@/shared/domain/geo/earth-point'
import { hilbertOfPoint } from '@/shared/domain/geo/hilbert'
import type { SearchRow } from '@/server/search/search-row'
import { MOST_COUNT, tierColumns } from '@/server/search/tier-columns'

const cap = (count: number) => Math.min(count, MOST_COUNT)

/** A row as the table holds it. Throws on a row that no search could find. */
export function searchColumns(row: SearchRow) {
  const { listingId, sellerId, place, sizeLoMm, sizeHiMm, nextDay, lastDay, openDays } = row
  if (openDays === 0n)
    throw new RangeError(`Listing ${listingId} can be had on no day: remove it from search`)
  return {
    category: row.categoryCode,
    hil: hilbertOfPoint(place),
    listingId,
    species: row.speciesCode,
    ...earthPoint(place),
    qty: cap(row.qty),
    minQty: cap(row.minQty),
    ...tierColumns(row),
    sizeLoMm,
    sizeHiMm,
    nextDay,
    lastDay,
    openDays,
    pickup: row.pickup ? 1 : 0,
    lane: row.lane,
    shipStates: row.shipStates,
    hiddenStates: row.hiddenStates,
    ratingRank: row.ratingRank,
    latE6: Math.round(place.lat * 1e6),
    lngE6: Math.round(place.lng * 1e6),
    sellerId,
    rev: row.rev,
  }
}
