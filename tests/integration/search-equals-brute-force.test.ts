import mysql from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { connect, disconnect } from '@/db/client'
import { inTransaction } from '@/db/transaction'
import { kmOfSquaredChord } from '@/shared/domain/geo/earth-point'
import { findByDay } from '@/server/search/find-by-day'
import { findInCircle, findOutwards } from '@/server/search/find-in-circle'
import type { FoundRow } from '@/server/search/found-row'
import { removeSearchRows, writeSearchRows } from '@/server/search/listing-search-store'
import { openListingSearch } from '@/server/search/search-listings'
import type { SearchHit, SearchQuery } from '@/server/search/search-query'
import { countOverview } from '@/server/search/overview-store'
import { walkPrices } from '@/server/search/walk-prices'
import { walkRanks } from '@/server/search/walk-ranks'
import { bruteForce } from '@/tests/bench/brute-force'
import { chances } from '@/tests/bench/chances'
import { pageFault } from '@/tests/bench/compare-page'
import { anyQuery } from '@/tests/bench/make-query'
import { makeFacts, makeListings } from '@/tests/bench/make-listings'
import { makeShipping } from '@/tests/bench/make-shipping'
import { freshDatabase, type TestDatabase } from '@/tests/support/test-database'

const LISTINGS = 4_000
const QUESTIONS = 340

describe('search', () => {
  const made = makeListings(LISTINGS, 42)
  const chance = chances(7)
  const ask = anyQuery(made, chance)
  const search = openListingSearch()
  let database: TestDatabase

  beforeAll(async () => {
    database = await freshDatabase('search')
    connect(database.url)
    const all = Array.from({ length: made.count }, (_, at) => made.row(at))
    await inTransaction((tx) => writeSearchRows(tx, all))
    await search.refresh()
  })
  afterAll(async () => {
    await disconnect()
    await database.drop()
  })

  async function walk(query: SearchQuery, mostPages: number): Promise<SearchHit[]> {
    const hits: SearchHit[] = []
    let page = await search.search(query)
    hits.push(...page.hits)
    for (let pages = 1; page.next && pages < mostPages; pages++) {
      page = await search.search({ ...query, after: page.next })
      hits.push(...page.hits)
    }
    return hits
  }

  /** A seller edits, sells out, comes back or moves: a few rows at a time. */
  async function editSome(): Promise<void> {
    const touched = Array.from({ length: 12 }, () => chance.between(0, LISTINGS - 1))
    for (const at of touched) {
      made.rev[at] = (made.rev[at] ?? 0) + 1
      if (chance.yes(0.3)) made.alive[at] = made.alive[at] === 1 ? 0 : 1
      else if (chance.yes(0.3)) {
        const other = chance.between(0, LISTINGS - 1)
        made.setPlace(at, made.row(other).place)
        makeShipping(made, at, chance)
      } else makeFacts(made, at, chance)
    }
    await inTransaction(async (tx) => {
      const unique = [...new Set(touched)]
      await writeSearchRows(
        tx,
        unique.filter((at) => made.alive[at] === 1).map((at) => made.row(at)),
      )
      await removeSearchRows(
        tx,
        unique.filter((at) => made.alive[at] === 0).map((at) => at + 1),
      )
    })
  }

  it(`finds what brute force finds, ${QUESTIONS} times, page by page, with edits in between`, async () => {
    const faults: string[] = []
    let pages = 0
    let found = 0
    for (let asked = 0; asked < QUESTIONS; asked++) {
      if (asked % 10 === 9) await editSome()
      const query = ask()
      const expected = bruteForce(made, query)
      const hits = await walk(query, 6)
      const fault = pageFault(hits, expected.slice(0, query.limit * 6))
      if (fault) faults.push(`${JSON.stringify(query)}: ${fault}`)
      pages += Math.ceil(hits.length / query.limit)
      found += hits.length
    }
    expect(faults).toEqual([])
    // The questions must have been worth asking.
    expect(pages).toBeGreaterThan(400)
    expect(found).toBeGreaterThan(5_000)
  })

  it('finds the same page on every way there is, whatever the planner would choose', async () => {
    const faults: string[] = []
    const ways: Record<string, number> = { circle: 0, outwards: 0, prices: 0, ranks: 0, days: 0 }
    const judge = (way: string, query: SearchQuery, rows: readonly FoundRow[]) => {
      ways[way] = (ways[way] ?? 0) + 1
      const { after: _after, ...first } = query
      const all = bruteForce(made, first)
      const from = query.after
        ? all.findIndex(({ listingId }) => listingId === query.after?.listingId) + 1
        : 0
      const hits = rows.map((row) => ({ ...row, distanceKm: kmOfSquaredChord(row.dm2) }))
      const fault = pageFault(hits, all.slice(from, from + query.limit))
      if (fault) faults.push(`${way} ${JSON.stringify(query)}: ${fault}`)
    }
    for (let asked = 0; asked < 140; asked++) {
      const first = ask()
      const { next } = await search.search(first)
      for (const query of next ? [first, { ...first, after: next }] : [first]) {
        judge('circle', query, await findInCircle(query, query.radiusKm))
        if (query.sort === 'nearest') {
          const { rows } = await findOutwards(query, {
            firstKm: query.radiusKm * (0.02 + 0.98 * chance.next()),
          })
          judge('outwards', query, rows)
        }
        const everyday = (query.count ?? 0) <= 1 || (query.categoryCode === 1 && (query.count ?? 0) <= 99)
        const categories = query.categoryCode === undefined ? [1, 2, 3, 4] : [query.categoryCode]
        if (query.sort === 'cheapest' && everyday)
          judge('prices', query, (await walkPrices(query, categories)).rows)
        if (query.sort === 'soonest' && query.days) {
          const { rows } = await findByDay(
            { ...query, days: query.days },
            query.radiusKm * (0.1 + 0.9 * chance.next()),
          )
          if (rows) judge('days', query, rows)
        }
        if (query.sort === 'soonest' || query.sort === 'best-rated') {
          const { days, ranks } = await countOverview()
          const ladder = query.sort === 'soonest' ? days : ranks
          const firstRung = ladder.reaching(categories, chance.between(1, LISTINGS / 4)) ?? 0
          const { rows } = await walkRanks(query, { categories, firstRung }, ladder)
          if (rows) judge('ranks', query, rows)
        }
      }
    }
    expect(faults).toEqual([])
    for (const [way, times] of Object.entries(ways)) expect(times, way).toBeGreaterThan(5)
  })

  it('counts for the chips what brute force counts', async () => {
    const faults: string[] = []
    for (let asked = 0; asked < 40; asked++) {
      await search.refresh()
      const query = ask()
      const { categories, species } = await search.facets(query)
      const all = bruteForce(made, { ...query, categoryCode: undefined, speciesCode: undefined })
      const inCategory =
        query.categoryCode === undefined ? all : bruteForce(made, { ...query, speciesCode: undefined })
      const total = (counts: typeof categories) => counts.reduce((sum, { count }) => sum + count, 0)
      const named = inCategory.filter(({ listingId }) => (made.species[listingId - 1] ?? 0) > 0)
      if (categories.every(({ atLeast }) => !atLeast) && total(categories) !== all.length) {
        faults.push(`${JSON.stringify(query)}: categories ${total(categories)}, not ${all.length}`)
      }
      if (species.every(({ atLeast }) => !atLeast) && total(species) !== named.length) {
        faults.push(`${JSON.stringify(query)}: species ${total(species)}, not ${named.length}`)
      }
    }
    expect(faults).toEqual([])
  })

  it('shows every listing on the map once, at every zoom, after all those edits', async () => {
    const everywhere = { south: 20, north: 55, west: -130, east: -60 }
    const alive = made.alive.reduce((sum, one) => sum + one, 0)
    for (const zoom of [0, 4, 6, 8]) {
      const pins = await search.pins({ bounds: everywhere, zoom })
      expect(pins.reduce((sum, { count }) => sum + count, 0)).toBeLessThanOrEqual(alive)
      if (pins.length < 500) expect(pins.reduce((sum, { count }) => sum + count, 0)).toBe(alive)
    }
    const owner = await mysql.createConnection({ uri: database.url, decimalNumbers: true })
    const [rows] = await owner.query<mysql.RowDataPacket[]>(
      'SELECT lvl, SUM(n) AS n, SUM(n < 0) AS wrong FROM map_cell GROUP BY lvl ORDER BY lvl',
    )
    await owner.end()
    expect(rows).toEqual([5, 7, 9, 11, 13].map((lvl) => ({ lvl, n: alive, wrong: 0 })))
  })
})
