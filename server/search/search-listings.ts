import { kmOfSquaredChord } from '@/shared/domain/geo/earth-point'
import { findInCircle, findOutwards } from '@/server/search/find-in-circle'
import type { FoundRow } from '@/server/search/found-row'
import type { ListingSearch } from '@/server/search/listing-search'
import { findPins } from '@/server/search/map-pins'
import { OverviewKeeper } from '@/server/search/overview-keeper'
import type { Overview } from '@/server/search/overview-store'
import { planSearch, type SearchPlan } from '@/server/search/plan-search'
import { FacetCounter } from '@/server/search/search-facets'
import type { SearchPage, SearchQuery } from '@/server/search/search-query'
import { Selectivity } from '@/server/search/selectivity'
import { walkPrices } from '@/server/search/walk-prices'
import { walkRanks } from '@/server/search/walk-ranks'

interface Found {
  rows: FoundRow[]
  trips: number
}

async function walk(
  plan: SearchPlan & { kind: 'rank-walk' },
  query: SearchQuery,
  overview: Overview,
): Promise<Found> {
  const ladder = query.sort === 'soonest' ? overview.days : overview.ranks
  const { rows, trips } = await walkRanks(query, plan, ladder)
  return rows ? { rows, trips } : { rows: await findInCircle(query, query.radiusKm), trips: trips + 1 }
}

async function follow(plan: SearchPlan, query: SearchQuery, overview: Overview): Promise<Found> {
  switch (plan.kind) {
    case 'grow':
      return findOutwards(query, plan.firstKm)
    case 'circle':
      return { rows: await findInCircle(query, query.radiusKm), trips: 1 }
    case 'price-walk':
      return walkPrices(query, plan.categories)
    case 'rank-walk':
      return walk(plan, query, overview)
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

  async function search(query: SearchQuery): Promise<SearchPage> {
    const overview = await keeper.current()
    const plan = planSearch(query, { overview, selectivity: selectivity.estimate(query) })
    const found = await follow(plan, query, overview)
    const last = found.rows[found.rows.length - 1]
    if (query.sort === 'nearest' && !query.after) {
      const full = last !== undefined && found.rows.length >= query.limit
      const km = full ? kmOfSquaredChord(last.dm2) : query.radiusKm
      selectivity.learn(query, overview.density.within(query, query.origin, km), found.rows.length)
    }
    return pageOf(found, query)
  }

  return {
    search,
    facets: (query) => facets.count(query),
    pins: findPins,
    refresh: async () => {
      await keeper.count()
      facets.forget()
    },
  }
}
