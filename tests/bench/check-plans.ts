import { circlePageSql } from '@/server/search/find-in-circle'
import type { SearchQuery, SearchSort } from '@/server/search/search-query'
import { priceStepSql } from '@/server/search/walk-prices'
import { rankPageSql } from '@/server/search/walk-ranks'
import { readPlan, type ReadPlan } from '@/tests/bench/read-plan'
import { TODAY } from '@/tests/bench/make-listings'

/** A query with every wish there is: whatever it tests must be in the index. */
const everyWish: Omit<SearchQuery, 'sort'> = {
  origin: { lat: 39.125, lng: -84.525 },
  radiusKm: 160,
  categoryCode: 1,
  speciesCode: 3,
  sizeMm: { from: 20, to: 60 },
  count: 20,
  days: { from: TODAY, until: TODAY + 20 },
  mostCents: 300,
  handover: { pickup: true, lanes: Array.from({ length: 257 }, (_, at) => 2 * at + 1) },
  buyerState: 'OH',
  limit: 24,
}
const shippedBy = (lanes: number): SearchQuery['shipped'] => ({
  lanes: Array.from({ length: lanes }, (_, at) => 24 * at + 10),
  state: 'OH',
})
const sorts: SearchSort[] = ['nearest', 'cheapest', 'soonest', 'best-rated']
const foot = { categoryCode: 1, smallPrice: 0, listingId: 0 }

interface Expected {
  name: string
  sql: string
  plan: Partial<ReadPlan>
}

function expectations(): Expected[] {
  const { speciesCode: _species, ...anySpecies } = everyWish
  return [
    ...sorts.map((sort) => ({
      name: `circle by species, ${sort}`,
      sql: circlePageSql({ ...everyWish, sort }, everyWish.radiusKm),
      plan: { key: 'k_species', access: 'range', covering: true },
    })),
    ...sorts.map((sort) => ({
      name: `circle by category, ${sort}`,
      sql: circlePageSql({ ...anySpecies, sort }, everyWish.radiusKm),
      plan: { key: 'PRIMARY', access: 'range' },
    })),
    ...sorts.flatMap((sort) =>
      [3, 40, 257].map((lanes) => ({
        name: `circle by ${lanes} lanes, ${sort}`,
        sql: circlePageSql({ ...everyWish, sort, shipped: shippedBy(lanes) }, everyWish.radiusKm),
        plan: { key: 'k_lane', access: 'range', covering: true },
      })),
    ),
    {
      name: 'walk by price',
      sql: priceStepSql({ ...everyWish, sort: 'cheapest' }, foot, { rows: 32 }),
      plan: { key: 'k_price', access: 'range', covering: true, sorted: false },
    },
    {
      name: 'rungs by first day',
      sql: rankPageSql({ ...anySpecies, sort: 'soonest' }, [1], TODAY + 2),
      plan: { key: 'k_soonest', access: 'range' },
    },
    {
      name: 'rungs by rating',
      sql: rankPageSql({ ...anySpecies, sort: 'best-rated' }, [1], 40),
      plan: { key: 'k_rated', access: 'range' },
    },
  ]
}

/** Texts that MariaDB would not run as they were meant; empty: all is well. */
export async function planFaults(): Promise<string[]> {
  const faults: string[] = []
  for (const { name, sql, plan } of expectations()) {
    const actual = await readPlan(sql)
    for (const [part, wanted] of Object.entries(plan)) {
      const is = actual[part as keyof ReadPlan]
      if (is !== wanted) faults.push(`${name}: ${part} is ${String(is)}, not ${String(wanted)}`)
    }
  }
  return faults
}
