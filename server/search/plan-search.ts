import { kmOfSquaredChord } from '@/shared/domain/geo/earth-point'
import { categoryCodes } from '@/server/search/category-codes'
import type { DensityHistogram } from '@/server/search/density-histogram'
import type { SearchQuery } from '@/server/search/search-query'
import { everydayOrder } from '@/server/search/tier-columns'

/** How a page is found. Whatever the plan, the page is the same; only the rows read on the way differ. */
export type SearchPlan =
  /** Read circles from `firstKm` outwards until one holds a page. */
  | { kind: 'grow'; firstKm: number }
  /** Read the whole circle and sort it. */
  | { kind: 'circle' }
  /** Go up the index of the sort in these categories until a page lies inside the circle. */
  | { kind: 'walk'; categories: readonly number[] }

const SMALL_CIRCLE_ROWS = 500
const SMALL_CIRCLE_HITS = 60
/** More rows than a page needs, so that the first circle is seldom too small. */
const ROOM = 1.6
const LEAST_KM = 4
/** A cover takes about so much more ground than its circle. */
const COVER_SHARE = 1.4
/** Walks of soonest and best rated go twice, and look rows up. */
const RANK_WALK_WEIGHT = 3

export interface Outlook {
  density: DensityHistogram
  /** Share of candidates that meet the wishes. */
  selectivity: number
}

/** The smallest circle that likely holds `want` candidates more than the pages before. */
export function guessRadiusKm(query: SearchQuery, density: DensityHistogram, want: number): number {
  const { origin, radiusKm, after } = query
  const doneKm = after ? kmOfSquaredChord(after.dm2) : 0
  const target = want + (doneKm > 0 ? density.within(query, origin, doneKm) : 0)
  const clamp = (km: number) => Math.min(radiusKm, Math.max(LEAST_KM, doneKm * 1.02, km))
  const most = density.within(query, origin, radiusKm)
  if (most <= target) return radiusKm
  let km = clamp(radiusKm * Math.sqrt(target / most))
  // Towns are denser than the circle's mean: look again where the last guess landed.
  for (let tries = 0; tries < 3; tries++) {
    const here = density.within(query, origin, km)
    if (here >= target * 0.8 && here <= target * 2) break
    km = clamp(km * Math.min(3, Math.max(0.35, Math.sqrt(target / Math.max(here, target / 16)))))
  }
  return km
}

function walkable(query: SearchQuery, density: DensityHistogram): readonly number[] | null {
  const own =
    query.categoryCode ??
    (query.speciesCode === undefined ? undefined : density.categoryOf(query.speciesCode))
  if (own === null) return null
  const categories = own === undefined ? categoryCodes : [own]
  const beyondEveryday =
    query.sort === 'cheapest' && categories.some((code) => (query.count ?? 0) > everydayOrder(code))
  return beyondEveryday ? null : categories
}

/** The cheapest way to a page, judged by rows read. */
export function planSearch(query: SearchQuery, { density, selectivity }: Outlook): SearchPlan {
  const candidates = density.within(query, query.origin, query.radiusKm)
  const hits = candidates * selectivity
  if (query.sort === 'nearest') {
    if (candidates <= SMALL_CIRCLE_ROWS || hits <= SMALL_CIRCLE_HITS) return { kind: 'circle' }
    const want = (query.limit * ROOM) / selectivity
    return { kind: 'grow', firstKm: guessRadiusKm(query, density, want) }
  }
  if (candidates <= SMALL_CIRCLE_ROWS) return { kind: 'circle' }
  const categories = walkable(query, density)
  if (!categories) return { kind: 'circle' }
  const passed = categories.reduce((sum, categoryCode) => sum + density.total({ categoryCode }), 0)
  // A walk by price starts at the bottom on every page; the other two start at the last hit.
  const wanted = query.limit + (query.sort === 'cheapest' ? (query.after?.seen ?? 0) : 0)
  const weight = query.sort === 'cheapest' ? 1 : RANK_WALK_WEIGHT
  const walked = (wanted * passed) / Math.max(hits, 0.1)
  return walked * weight < candidates * COVER_SHARE ? { kind: 'walk', categories } : { kind: 'circle' }
}
