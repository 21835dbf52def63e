import { kmOfSquaredChord } from '@/shared/domain/geo/earth-point'
import { onDay } from '@/server/search/find-by-day'
import { categoryCodes } from '@/server/search/category-codes'
import type { DensityHistogram } from '@/server/search/density-histogram'
import type { Overview } from '@/server/search/overview-store'
import type { SearchQuery } from '@/server/search/search-query'
import { UNRATED_RANK } from '@/server/search/search-row'
import type { Selectivity } from '@/server/search/selectivity'
import { everydayOrder } from '@/server/search/tier-columns'

/** How a page is found. Whatever the plan, the page is the same; only the rows read on the way differ. */
export type SearchPlan =
  /** Read circles from `firstKm` outwards until one holds a page. */
  | { kind: 'grow'; firstKm: number }
  /** Read the whole circle and sort it. */
  | { kind: 'circle' }
  /** Go up the prices in these categories until a page lies inside the circle. */
  | { kind: 'price-walk'; categories: readonly number[] }
  /** Read outwards for the first day asked, then for the next. */
  | { kind: 'day-grow'; days: NonNullable<SearchQuery['days']>; firstKm: number }
  /** Read the lowest rungs of the sort in these categories, up to `firstRung`, then more until there is a page. */
  | { kind: 'rank-walk'; categories: readonly number[]; firstRung: number }

const SMALL_CIRCLE_ROWS = 500
const SMALL_CIRCLE_HITS = 60
/** More rows than a page needs, so that the first circle or rung is seldom too small. */
const ROOM = 1.6
const LEAST_KM = 4
/** A cover takes about so much more ground than its circle. */
const COVER_SHARE = 1.4
/** A rung's row inside the circle is looked up, which costs several rows of a covering index. */
const LOOK_UP_ROWS = 5
/** A day is read on its own when it holds so many pages. */
const FULL_DAYS = 3

export interface Outlook {
  overview: Overview
  selectivity: Selectivity
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

function categoriesOf(query: SearchQuery, density: DensityHistogram): readonly number[] | null {
  if (query.categoryCode !== undefined) return [query.categoryCode]
  if (query.speciesCode === undefined) return categoryCodes
  const own = density.categoryOf(query.speciesCode)
  return own === null ? null : [own]
}

interface Walk {
  categories: readonly number[]
  /** Listings in the circle, before the wishes. */
  candidates: number
  /** Listings of the categories, of which the walk passes some. */
  all: number
}

function planPriceWalk(query: SearchQuery, { categories, candidates, all }: Walk, share: number): SearchPlan {
  if (categories.some((code) => (query.count ?? 0) > everydayOrder(code))) return { kind: 'circle' }
  // Every page starts at the bottom.
  const passed = ((query.limit + (query.after?.seen ?? 0)) * all) / Math.max(candidates * share, 0.1)
  return passed < candidates * COVER_SHARE ? { kind: 'price-walk', categories } : { kind: 'circle' }
}

/** null: the first day would not fill a page, or no day was asked. */
function planByDay(
  query: SearchQuery,
  candidates: number,
  { overview, selectivity }: Outlook,
): SearchPlan | null {
  const { days, limit } = query
  if (query.sort !== 'soonest' || !days) return null
  const share = selectivity.estimate(onDay(query, query.after?.by ?? days.from))
  if (candidates * share < limit * FULL_DAYS) return null
  return { kind: 'day-grow', days, firstKm: guessRadiusKm(query, overview.density, (limit * ROOM) / share) }
}

function planRankWalk(query: SearchQuery, walk: Walk, { overview, selectivity }: Outlook): SearchPlan {
  const { categories, candidates, all } = walk
  const soonest = query.sort === 'soonest'
  const ladder = soonest ? overview.days : overview.ranks
  const inCircle = candidates / Math.max(all, 1)
  const start = query.after?.by ?? (soonest ? (query.days?.from ?? 0) : 0)
  // Whoever could be had earlier may still be had from `start` on, so the rungs below it are read too.
  const skipped = soonest ? 0 : ladder.upTo(categories, start - 1)
  const want = skipped + (query.limit * ROOM) / Math.max(inCircle * selectivity.estimate(query), 1e-9)
  const guess = ladder.reaching(categories, want)
  if (guess === null) return { kind: 'circle' }
  const firstRung = Math.max(guess, start)
  const passed = ladder.upTo(categories, firstRung) - skipped
  const cost = passed * (1 + inCircle * LOOK_UP_ROWS)
  // Unrated sellers stand on one rung, half of all.
  const endless = !soonest && firstRung >= UNRATED_RANK
  if (endless || cost > candidates * COVER_SHARE) return { kind: 'circle' }
  return { kind: 'rank-walk', categories, firstRung }
}

/** The cheapest way to a page, judged by rows read. */
export function planSearch(query: SearchQuery, outlook: Outlook): SearchPlan {
  const { density } = outlook.overview
  const candidates = density.within(query, query.origin, query.radiusKm)
  if (candidates <= SMALL_CIRCLE_ROWS) return { kind: 'circle' }
  const share = outlook.selectivity.estimate(query)
  if (query.sort === 'nearest') {
    // By lane little is read but what is found.
    const few = query.shipped ? SMALL_CIRCLE_ROWS : SMALL_CIRCLE_HITS
    if (candidates * share <= few) return { kind: 'circle' }
    return { kind: 'grow', firstKm: guessRadiusKm(query, density, (query.limit * ROOM) / share) }
  }
  if (query.shipped) return { kind: 'circle' }
  const byDay = planByDay(query, candidates, outlook)
  if (byDay) return byDay
  const categories = categoriesOf(query, density)
  if (!categories) return { kind: 'circle' }
  const all = categories.reduce((sum, categoryCode) => sum + density.total({ categoryCode }), 0)
  const walk = { categories, candidates, all }
  return query.sort === 'cheapest' ? planPriceWalk(query, walk, share) : planRankWalk(query, walk, outlook)
}
