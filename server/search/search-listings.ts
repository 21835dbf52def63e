import { kmOfSquaredChord } from '@/shared/domain/geo/earth-point'
import { findByDay, onDay } from '@/server/search/find-by-day'
import { findInCircle, findOutwards } from '@/server/search/find-in-circle'
import type { FoundRow } from '@/server/search/found-row'
import type { ListingSearch } from '@/server/search/listing-search'
import { findPins } from '@/server/search/map-pins'
import { nearLanes } from '@/server/search/near-lanes'
import { OverviewKeeper } from '@/server/search/overview-keeper'
import type { Overview } from '@/server/search/overview-store'
import { planSearch, type Outlook, type SearchPlan } from '@/server/search/plan-search'
import { FacetCounter } from '@/server/search/search-facets'
import type { SearchPage, SearchQuery } from '@/server/search/search-query'
import { Selectivity } from '@/server/search/selectivity'
import { walkPrices } from '@/server/search/walk-prices'
import { walkRanks } from '@/server/search/walk-ranks'

interface Found {
  rows: FoundRow[]
  trips: number
}

/** What a shorter way found, or else the whole circle. */
async function orCircle(
  { rows, trips }: { rows: FoundRow[] | null; trips: number },
  query: SearchQuery,
): Promise<Found> {
  return rows ? { rows, trips } : { rows: await findInCircle(query, query.radiusKm), trips: trips + 1 }
}

async function follow(plan: SearchPlan, query: SearchQuery, overview: Overview): Promise<Found> {
  switch (plan.kind) {
    case 'grow':
      return findOutwards(query, plan)
    case 'circle':
      return orCircle({ rows: null, trips: 0 }, query)
    case 'price-walk':
      return walkPrices(query, plan.categories)
    case 'day-grow':
      return orCircle(await findByDay({ ...query, days: plan.days }, plan.firstKm), query)
    case 'rank-walk': {
      const ladder = query.sort === 'soonest' ? overview.days : overview.ranks
      return orCircle(await walkRanks(query, plan, ladder), query)
    }
  }
}

/** What share of the listings read through met the wishes, told to whoever guesses next time. */
function learnFrom({ rows }: Found, query: SearchQuery, { overview, selectivity }: Outlook): void {
  if (query.after) return
  const last = rows[rows.length - 1]
  const full = last !== undefined && rows.length >= query.limit
  const km = full ? kmOfSquaredChord(last.dm2) : query.radiusKm
  const candidates = () => overview.density.within(query, query.origin, km)
  if (query.sort === 'nearest') selectivity.learn(query, candidates(), rows.length)
  // A page that the first day fills is that day's nearest page.
  if (query.sort === 'soonest' && full && query.days && last.sortBy === query.days.from) {
    selectivity.learn(onDay(query, query.days.from), candidates(), rows.length)
  }
}

function pageOf({ rows, trips }: Found, query: SearchQuery): SearchPage {
  const last = rows.length < query.limit ? undefined : rows[rows.length - 1]
  return {
    hits: rows.map(({ listingId, dm2, unitCents }) => ({
      listingId,
      unitCents,
      distanceKm: kmOfSquaredChord(dm2),
    })),
    next: last
      ? {
          by: last.sortBy,
          dm2: last.dm2,
          listingId: last.listingId,
          seen: (query.after?.seen ?? 0) + rows.length,
        }
      : null,
    trips,
  }
}

/** Search over the database. Keeps an overview of all listings, what it learnt of wishes, and half a minute of counts. */
export function openListingSearch(): ListingSearch & { refresh: () => Promise<void> } {
  const keeper = new OverviewKeeper()
  const selectivity = new Selectivity()
  const facets = new FacetCounter()

  async function search(asked: SearchQuery): Promise<SearchPage> {
    const query = nearLanes(asked)
    const overview = await keeper.current()
    const outlook = { overview, selectivity }
    const found = await follow(planSearch(query, outlook), query, overview)
    learnFrom(found, query, outlook)
    return pageOf(found, query)
  }

  return {
    search,
    facets: (asked) => facets.count(nearLanes(asked)),
    pins: findPins,
    refresh: async () => {
      await keeper.count()
      facets.forget()
    },
  }
}
