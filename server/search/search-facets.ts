import { circleCover } from '@/shared/domain/geo/circle-cover'
import { classSql } from '@/server/search/find-in-circle'
import { readSearchRows } from '@/server/search/read-search-store'
import type { SearchQuery } from '@/server/search/search-query'
import { circleSql, wishSql } from '@/server/search/search-sql'

const FRESH_MS = 30_000
const MOST_REMEMBERED = 300
/** Above this a screen says "1,000+". */
const COUNT_CAP = 1_000

export interface FacetCount {
  code: number
  count: number
  /** True: there are more, and `count` is where counting stopped mattering. */
  atLeast: boolean
}

export interface SearchFacets {
  categories: FacetCount[]
  /** Of the category asked for, or of all; most listings first. */
  species: FacetCount[]
}

interface Tally {
  categoryCode: number
  speciesCode: number
  count: number
}

const capped = (code: number, count: number): FacetCount => ({
  code,
  count: Math.min(count, COUNT_CAP),
  atLeast: count > COUNT_CAP,
})

function facetsSql(query: SearchQuery): string {
  const { index, where } = classSql(query)
  const ranges = circleCover({ centre: query.origin, radiusKm: query.radiusKm })
  const tests = [...where, ...circleSql(query, ranges, query.radiusKm), ...wishSql(query)]
  return `SELECT category,species,COUNT(*) FROM listing_search FORCE INDEX (${index}) WHERE ${tests.join(' AND ')} GROUP BY category,species`
}

async function tally(query: SearchQuery): Promise<Tally[]> {
  const rows = await readSearchRows(facetsSql(query))
  return rows.map(([categoryCode = 0, speciesCode = 0, count = 0]) => ({ categoryCode, speciesCode, count }))
}

function summed(tallies: readonly Tally[], keyOf: (tally: Tally) => number): FacetCount[] {
  const sums = new Map<number, number>()
  for (const one of tallies) sums.set(keyOf(one), (sums.get(keyOf(one)) ?? 0) + one.count)
  return [...sums].sort((a, b) => b[1] - a[1] || a[0] - b[0]).map(([code, count]) => capped(code, count))
}

/**
 * Counts for the filter chips, exact, half a minute old at most. Category and species are not part of what is
 * counted, so going from chip to chip asks the database once.
 */
export class FacetCounter {
  private readonly held = new Map<string, { atMs: number; tallies: Promise<Tally[]> }>()

  async count(query: SearchQuery): Promise<SearchFacets> {
    const tallies = await this.talliesOf(query)
    const inCategory = tallies.filter(
      ({ categoryCode, speciesCode }) =>
        speciesCode > 0 && (query.categoryCode === undefined || categoryCode === query.categoryCode),
    )
    return {
      categories: summed(tallies, ({ categoryCode }) => categoryCode),
      species: summed(inCategory, ({ speciesCode }) => speciesCode),
    }
  }

  forget(): void {
    this.held.clear()
  }

  private talliesOf(query: SearchQuery): Promise<Tally[]> {
    const { categoryCode: _category, speciesCode: _species, sort: _sort, after: _after, ...wishes } = query
    const asked: SearchQuery = { ...wishes, sort: 'nearest' }
    const key = JSON.stringify(asked)
    const known = this.held.get(key)
    if (known && performance.now() - known.atMs < FRESH_MS) return known.tallies
    const tallies = tally(asked)
    this.held.delete(key)
    this.held.set(key, { atMs: performance.now(), tallies })
    // A failed count is not remembered.
    tallies.catch(() => this.held.delete(key))
    const [oldest] = this.held.keys()
    if (this.held.size > MOST_REMEMBERED && oldest !== undefined) this.held.delete(oldest)
    return tallies
  }
}
