import { kmOfSquaredChord } from '@/shared/domain/geo/earth-point'
import { DensityKeeper } from '@/server/search/density-keeper'
import { findInCircle, findOutwards } from '@/server/search/find-in-circle'
import type { FoundRow } from '@/server/search/found-row'
import type { ListingSearch } from '@/server/search/listing-search'
import { findPins } from '@/server/search/map-pins'
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

async function follow(plan: SearchPlan, query: SearchQuery): Promise<Found> {
  if (plan.kind === 'grow') return findOutwards(query, plan.firstKm)
  if (plan.kind === 'circle') return { rows: await findInCircle(query, query.radiusKm), trips: 1 }
  if (query.sort === 'cheapest') return walkPrices(query, plan.categories)
  const rows = await walkRanks(query, plan.categories)
  return rows ? { rows, trips: 2 } : { rows: await findInCircle(query, query.radiusKm), trips: 2 }
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

/** Search over the database. Keeps a density histogram, what it learnt of wishes, and half a minute of counts. */
export function openListingSearch(): ListingSearch & { refresh: () => Promise<void> } {
  const keeper = new DensityKeeper()
  const selectivity = new Selectivity()
  const facets = new FacetCounter()

  async function search(query: SearchQuery): Promise<SearchPage> {
    const density = await keeper.current()
    const plan = planSearch(query, { density, selectivity: selectivity.estimate(query) })
    const found = await follow(plan, query)
    const last = found.rows[found.rows.length - 1]
    if (query.sort === 'nearest' && !query.after) {
      const full = last !== undefined && found.rows.length >= query.limit
      const km = full ? kmOfSquaredChord(last.dm2) : query.radiusKm
      selectivity.learn(query, density.within(query, query.origin, km), found.rows.length)
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
