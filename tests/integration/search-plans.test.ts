import mysql, { type RowDataPacket } from 'mysql2/promise'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'

import { connect, disconnect, rawPool } from '@/db/client'
import { inTransaction } from '@/db/transaction'
import { writeSearchRows } from '@/server/search/listing-search-store'
import { openListingSearch } from '@/server/search/search-listings'
import { chances } from '@/tests/bench/chances'
import { planFaults } from '@/tests/bench/check-plans'
import { shapedQueries, type Shape } from '@/tests/bench/make-query'
import { makeListings } from '@/tests/bench/make-listings'
import { measureSeason, slownessFaults } from '@/tests/bench/measure-season'
import { plantLanes, plantSlowness } from '@/tests/bench/plant-fault'
import { readPlan } from '@/tests/bench/read-plan'
import { rowsRead } from '@/tests/bench/rows-read'
import { safeLanes } from '@/shared/domain/season/season-at'
import { seasonTable } from '@/shared/domain/season/season-table.gen'
import { freshDatabase, type TestDatabase } from '@/tests/support/test-database'

const LISTINGS = 4_000

// Rows read for a page on average at this size; measured, and half as much again.
const BUDGETS: Record<Shape, number> = { A: 20, B: 190, C: 18, D: 103, E: 88, F: 130, G: 166, H: 30 }

async function tablesRead(sql: string): Promise<number> {
  const [rows] = await rawPool().query<RowDataPacket[]>(`EXPLAIN ${sql}`)
  return rows.length
}

describe('the plans of search', () => {
  const made = makeListings(LISTINGS, 42)
  let database: TestDatabase

  beforeAll(async () => {
    database = await freshDatabase('plans')
    // One connection: rows read are counted by session.
    connect(database.url, 1)
    const rows = Array.from({ length: made.count }, (_, at) => made.row(at))
    await inTransaction((tx) => writeSearchRows(tx, rows))
    await rawPool().query('SELECT 1')
  })
  afterAll(async () => {
    await disconnect()
    await database.drop()
  })

  it('never leave their index', async () => {
    expect(await planFaults()).toEqual([])
  })

  it('would be caught when they do: a column that no index holds costs the covering read', async () => {
    const sql =
      'SELECT rev FROM listing_search FORCE INDEX (k_species) WHERE species = 3 AND hil BETWEEN 1 AND 9'
    expect((await readPlan(sql)).covering).toBe(false)
  })

  it('read one table with the longest list of lanes there is', async () => {
    const bands = Array.from({ length: seasonTable.bands }, (_, band) => band)
    const longest = Math.max(
      ...bands.flatMap((band) => [1, 18, 30, 40].map((week) => safeLanes(band, week).length)),
    )
    expect(longest).toBeGreaterThan(100)
    // MariaDB makes a subquery of a list of a thousand and more.
    expect(longest).toBeLessThan(900)
    const lanes = (count: number) => Array.from({ length: count }, (_, at) => at + 1).join(',')
    const sql = (count: number) =>
      `SELECT listing_id FROM listing_search FORCE INDEX (k_species) WHERE species = 3 AND hil BETWEEN 1 AND 9 AND lane IN (${lanes(count)})`
    expect(await tablesRead(sql(900))).toBe(1)
    expect(await tablesRead(sql(1_200))).toBeGreaterThan(1)
  })

  it.each(Object.entries(BUDGETS))('read few rows for shape %s', async (shape, budget) => {
    const search = openListingSearch()
    const ask = shapedQueries(shape as Shape, made, chances(11))
    await search.refresh()
    let rows = 0
    for (let asked = 0; asked < 40; asked++) rows += (await rowsRead(() => search.search(ask()))).rows
    expect(rows / 40).toBeLessThan(budget)
    expect(rows / 40).toBeGreaterThan(budget / 4)
  })

  it('are measured with and without the season filter, and what is slow or wrong with it is noticed', async () => {
    const search = openListingSearch()
    await search.refresh()
    const asked = { pairs: 40, seed: 3 }
    const fair = await measureSeason(made, search, asked)
    expect(fair.faults).toEqual([])
    expect(fair.all.meanHits.shipped).toBeGreaterThan(1)
    expect(slownessFaults(99_999, { all: { ...fair.all, ratio: 9 } })).toEqual([])
    const slow = await measureSeason(made, plantSlowness(search), asked)
    expect(slownessFaults(100_000, slow)).toHaveLength(1)
    // From here on the table is wrong: this test comes last.
    const owner = await mysql.createConnection({ uri: database.url })
    await plantLanes(owner)
    await owner.end()
    const wrong = await measureSeason(made, search, asked)
    expect(wrong.faults.length).toBeGreaterThan(0)
    expect(wrong.faults.every((fault) => fault.includes('shipped'))).toBe(true)
  })
})
