import mysql from 'mysql2/promise'
import { sql } from 'drizzle-orm'

import { inTransaction } from '@/db/transaction'
import { writeSearchRows } from '@/server/search/listing-search-store'
import { findPins } from '@/server/search/map-pins'
import { FacetCounter } from '@/server/search/search-facets'
import { bruteForce } from '@/tests/bench/brute-force'
import { chances } from '@/tests/bench/chances'
import type { MadeListings } from '@/tests/bench/made-listings'
import { buyers, PAGE } from '@/tests/bench/make-query'
import { timesOf, type Times } from '@/tests/bench/times'

const SAMPLES = 20
const COUNT_CAP = 1_000

async function timed<T>(ms: number[], work: () => Promise<T>): Promise<T> {
  const before = performance.now()
  const result = await work()
  ms.push(performance.now() - before)
  return result
}

async function facets(made: MadeListings, radiusKm: number, faults: string[]): Promise<Times> {
  const buyer = buyers(chances(5))
  const ms: number[] = []
  for (let at = 0; at < SAMPLES; at++) {
    const query = { ...buyer(), radiusKm, sort: 'nearest' as const, limit: PAGE }
    // A counter of its own each time: nothing remembered.
    const { categories } = await timed(ms, () => new FacetCounter().count(query))
    const exact = new Map<number, number>()
    for (const { listingId } of bruteForce(made, query)) {
      const code = made.category[listingId - 1] ?? 0
      exact.set(code, (exact.get(code) ?? 0) + 1)
    }
    for (const { code, count } of categories) {
      const want = Math.min(COUNT_CAP, exact.get(code) ?? 0)
      if (count !== want) faults.push(`facets ${radiusKm} km: category ${code} counts ${count}, not ${want}`)
    }
  }
  return timesOf(ms)
}

/** A screen of 1,280 by 800 points. */
async function map(zoom: number): Promise<Times> {
  const buyer = buyers(chances(6))
  const ms: number[] = []
  const high = (800 * 180) / (256 * 2 ** zoom)
  const wide = (1280 * 360) / (256 * 2 ** zoom)
  for (let at = 0; at < SAMPLES; at++) {
    const { lat, lng } = buyer().origin
    const bounds = {
      south: Math.max(-90, lat - high / 2),
      north: Math.min(90, lat + high / 2),
      west: Math.max(-180, lng - wide / 2),
      east: Math.min(180, lng + wide / 2),
    }
    await timed(ms, () => findPins({ bounds, zoom, categoryCode: 1 }))
  }
  return timesOf(ms)
}

/** What keeping search in step adds to a transaction that writes one row of its own. */
async function writes(made: MadeListings, ownerUrl: string): Promise<Record<string, Times>> {
  const owner = await mysql.createConnection({ uri: ownerUrl })
  await owner.query('CREATE TABLE bench_note (id INT AUTO_INCREMENT PRIMARY KEY, words VARCHAR(80) NOT NULL)')
  await owner.end()
  const chance = chances(8)
  const [alone, changed, moved]: number[][] = [[], [], []]
  const note = sql`INSERT INTO bench_note (words) VALUES ('twenty fish sold')`
  for (let at = 0; at < SAMPLES * 5; at++) {
    const which = chance.between(0, made.count - 1)
    const row = made.row(which)
    const elsewhere = { ...row, place: made.row(chance.between(0, made.count - 1)).place }
    await timed(alone ?? [], () => inTransaction((tx) => tx.execute(note)))
    const withSearch = (to: typeof row) =>
      inTransaction(async (tx) => {
        await tx.execute(note)
        await writeSearchRows(tx, [to])
      })
    await timed(changed ?? [], () => withSearch({ ...row, qty: row.qty + 1, rev: row.rev + 1 }))
    await timed(moved ?? [], () => withSearch(elsewhere))
    await withSearch(row)
  }
  return {
    'write alone': timesOf(alone ?? []),
    'write + search row': timesOf(changed ?? []),
    'write + search row + map marks': timesOf(moved ?? []),
  }
}

/** What else search costs: chips, map, and staying in step. Counts are checked. */
export async function measureExtras(
  made: MadeListings,
  ownerUrl: string,
): Promise<{ times: Record<string, Times>; faults: string[] }> {
  const faults: string[] = []
  const times: Record<string, Times> = {}
  for (const km of [25, 100, 500]) times[`facets ${km} km`] = await facets(made, km, faults)
  for (const zoom of [4, 6, 8, 10, 12]) times[`map zoom ${zoom}`] = await map(zoom)
  return { times: { ...times, ...(await writes(made, ownerUrl)) }, faults }
}
