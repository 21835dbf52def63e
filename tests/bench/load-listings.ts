import { toSnakeCase } from 'drizzle-orm/casing'
import mysql from 'mysql2/promise'

import { inTransaction } from '@/db/transaction'
import { changeMapCells } from '@/server/search/map-cell-store'
import { writeSearchRows } from '@/server/search/listing-search-store'
import { searchColumns } from '@/server/search/search-columns'
import type { MadeListings } from '@/tests/bench/made-listings'

/** Above this the product's own writer would take longer than all questions together. */
const MOST_WRITTEN_ONE_BY_ONE = 20_000
const BATCH = 1_000

/** Positions in order of the primary key: InnoDB then fills its pages one after another. */
function keyOrder(made: MadeListings): Uint32Array {
  const keys = Float64Array.from({ length: made.count }, (_, at) => {
    const { category, hil } = searchColumns(made.row(at))
    return category * 2 ** 32 + hil
  })
  return Uint32Array.from({ length: made.count }, (_, at) => at).sort(
    (a, b) => (keys[a] ?? 0) - (keys[b] ?? 0) || a - b,
  )
}

async function loadInBulk(made: MadeListings, ownerUrl: string): Promise<void> {
  const owner = await mysql.createConnection({ uri: ownerUrl })
  await owner.query('SET unique_checks = 0')
  const order = keyOrder(made)
  const places: { categoryCode: number; hil: number; by: number }[] = []
  for (let from = 0; from < order.length; from += BATCH) {
    const rows = [...order.subarray(from, from + BATCH)].map((at) => searchColumns(made.row(at)))
    const names = Object.keys(rows[0] ?? {}).map(toSnakeCase)
    const values = rows.map((row) => {
      places.push({ categoryCode: row.category, hil: row.hil, by: 1 })
      const columns = Object.values(row).map((value) =>
        typeof value === 'string' ? `'${value}'` : String(value),
      )
      return `(${columns.join(',')},${row.category},${row.hil})`
    })
    await owner.query(
      `INSERT INTO listing_search (${names.join(',')},counted_category,counted_hil) VALUES ${values.join(',')}`,
    )
  }
  await owner.end()
  await inTransaction((tx) => changeMapCells(tx, places))
}

/** Fills listing_search and map_cell: by the product's writer, or in bulk when there are very many. */
export async function loadListings(made: MadeListings, ownerUrl: string): Promise<void> {
  if (made.count > MOST_WRITTEN_ONE_BY_ONE) await loadInBulk(made, ownerUrl)
  else {
    const rows = Array.from({ length: made.count }, (_, at) => made.row(at))
    await inTransaction((tx) => writeSearchRows(tx, rows))
  }
  const owner = await mysql.createConnection({ uri: ownerUrl })
  await owner.query('ANALYZE TABLE listing_search, map_cell')
  await owner.end()
}
