import { earthPoint } from '@/shared/domain/geo/earth-point'
import { stateBit } from '@/shared/domain/rules/state-bits'
import { MOST_TIERS, type MadeListings } from '@/tests/bench/made-listings'
import type { SearchQuery } from '@/server/search/search-query'

export interface BruteHit {
  listingId: number
  by: number
  dm2: number
  unitCents: number
  distanceKm: number
}

const RADIANS = Math.PI / 180

/** Another formula than the product's, so that a fault in one shows. */
function haversineKm(made: MadeListings, at: number, { origin }: SearchQuery): number {
  const lat = ((made.latE6[at] ?? 0) / 1e6) * RADIANS
  const lng = ((made.lngE6[at] ?? 0) / 1e6) * RADIANS
  const own = origin.lat * RADIANS
  const h =
    Math.sin((lat - own) / 2) ** 2 +
    Math.cos(lat) * Math.cos(own) * Math.sin((lng - origin.lng * RADIANS) / 2) ** 2
  return 2 * 6371.0088 * Math.asin(Math.sqrt(h))
}

function unitCents(made: MadeListings, at: number, count: number): number {
  let cents = made.tierCents[at * MOST_TIERS] ?? 0
  for (let tier = 1; tier < (made.tierCount[at] ?? 0); tier++) {
    if (count >= (made.tierFrom[at * MOST_TIERS + tier] ?? 0))
      cents = made.tierCents[at * MOST_TIERS + tier] ?? 0
  }
  return cents
}

/** The first open day in the range, day by day; null: none. */
function firstOpenDay(made: MadeListings, at: number, { days }: SearchQuery): number | null {
  const first = made.firstDay[at] ?? 0
  if (!days) return first
  for (let k = 0; k < 32; k++) {
    const day = first + k
    if (((made.openAfter[at] ?? 0) >>> k) & 1 && day >= days.from && day <= days.until) return day
  }
  return null
}

function meets(made: MadeListings, at: number, query: SearchQuery): boolean {
  const { categoryCode, speciesCode, sizeMm, count, handover, shipped, buyerState } = query
  if (made.alive[at] === 0) return false
  if (speciesCode !== undefined && made.species[at] !== speciesCode) return false
  if (categoryCode !== undefined && made.category[at] !== categoryCode) return false
  if (count !== undefined && ((made.minQty[at] ?? 0) > count || (made.qty[at] ?? 0) < count)) return false
  if (sizeMm && ((made.sizeLo[at] ?? 0) > sizeMm.to || (made.sizeHi[at] ?? 0) < sizeMm.from)) return false
  if (handover) {
    const collected = handover.pickup && made.pickup[at] === 1
    if (!collected && !handover.lanes.includes(made.lane[at] ?? 0)) return false
  }
  if (shipped) {
    const served = (made.shipStates[at] ?? 0n) & (stateBit(shipped.state) ?? 0n)
    if (served === 0n || !shipped.lanes.includes(made.lane[at] ?? 0)) return false
  }
  const state = buyerState === undefined ? null : stateBit(buyerState)
  return state === null || ((made.hiddenStates[at] ?? 0n) & state) === 0n
}

/** Every listing tested one by one: what search must find, in its order, all of it. */
export function bruteForce(made: MadeListings, query: SearchQuery): BruteHit[] {
  const { x, y, z } = earthPoint(query.origin)
  const radius = (2 * 63_710_088 * Math.sin((query.radiusKm * 1000) / (2 * 6_371_008.8))) ** 2
  const hits: BruteHit[] = []
  for (let at = 0; at < made.count; at++) {
    const dx = (made.x[at] ?? 0) - x
    const dy = (made.y[at] ?? 0) - y
    const dz = (made.z[at] ?? 0) - z
    const dm2 = dx * dx + dy * dy + dz * dz
    if (dm2 > radius || !meets(made, at, query)) continue
    const cents = unitCents(made, at, query.count ?? made.minQty[at] ?? 0)
    if (query.mostCents !== undefined && cents > query.mostCents) continue
    const day = firstOpenDay(made, at, query)
    if (day === null) continue
    const by = { nearest: dm2, cheapest: cents, soonest: day, 'best-rated': made.ratingRank[at] ?? 0 }[
      query.sort
    ]
    hits.push({ listingId: at + 1, by, dm2, unitCents: cents, distanceKm: haversineKm(made, at, query) })
  }
  const nearestNext = query.sort === 'soonest' || query.sort === 'best-rated'
  return hits.sort((a, b) => a.by - b.by || (nearestNext ? a.dm2 - b.dm2 : 0) || a.listingId - b.listingId)
}
