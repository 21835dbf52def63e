import { inArray, ne, or, sql } from 'drizzle-orm'
import { toSnakeCase } from 'drizzle-orm/casing'

import type { Tx } from '@/db/client'
import { listingSearch } from '@/db/schema/listing-search'
import { changeMapCells } from '@/server/search/map-cell-store'
import { searchColumns } from '@/server/search/search-columns'
import type { SearchRow } from '@/server/search/search-row'
import { whole } from '@/server/search/search-sql'

const BATCH = 200

/**
 * One text for all rows, of whole numbers only: the query builder would take three times as long as the database.
 * Nothing is overwritten of the key and of what the map has counted.
 */
function upsertText(rows: readonly SearchRow[]): string {
  const columns = rows.map(searchColumns)
  const names = Object.keys(columns[0] ?? {}).map(toSnakeCase)
  const values = columns.map((row) => `(${Object.values(row).map(valueText).join(',')})`)
  const overwritten = names.filter((name) => name !== 'listing_id').map((name) => `${name}=VALUES(${name})`)
  return `INSERT INTO listing_search (${names.join(',')}) VALUES ${values.join(',')} ON DUPLICATE KEY UPDATE ${overwritten.join(',')}`
}

/** The one text among the numbers is digits of prices. */
function valueText(value: number | bigint | string): string {
  if (typeof value !== 'string') return whole(value)
  if (!/^\d*$/.test(value)) throw new RangeError('prices are written in digits')
  return `'${value}'`
}

/** Brings the map's marks in step with the rows just written: each row remembers where it was counted. */
async function recount(tx: Tx, listingIds: number[]): Promise<void> {
  const { category, hil, listingId, countedCategory, countedHil } = listingSearch
  const moved = await tx
    .select({ listingId, category, hil, countedCategory, countedHil })
    .from(listingSearch)
    .where(
      sql`${inArray(listingId, listingIds)} and ${or(ne(countedCategory, category), ne(countedHil, hil))}`,
    )
    .for('update')
  if (moved.length === 0) return
  await tx
    .update(listingSearch)
    .set({ countedCategory: sql`${category}`, countedHil: sql`${hil}` })
    .where(
      inArray(
        listingId,
        moved.map((row) => row.listingId),
      ),
    )
  await changeMapCells(
    tx,
    moved.flatMap((row) => [
      { categoryCode: row.category, hil: row.hil, by: 1 },
      ...(row.countedCategory > 0
        ? [{ categoryCode: row.countedCategory, hil: row.countedHil, by: -1 }]
        : []),
    ]),
  )
}

/**
 * Puts the rows in place of what search knew of these listings, and keeps the map in step, in the caller's
 * transaction. An upsert, as deleting and inserting deadlocks under concurrent writers.
 */
export async function writeSearchRows(tx: Tx, rows: readonly SearchRow[]): Promise<void> {
  const ordered = [...rows].sort((a, b) => a.listingId - b.listingId)
  for (let from = 0; from < ordered.length; from += BATCH) {
    const batch = ordered.slice(from, from + BATCH)
    await tx.execute(sql.raw(upsertText(batch)))
    await recount(
      tx,
      batch.map((row) => row.listingId),
    )
  }
}

interface Removed {
  category: number
  hil: number
}

/** Takes listings out of search and off the map, in the caller's transaction. Unknown ones do no harm. */
export async function removeSearchRows(tx: Tx, listingIds: readonly number[]): Promise<void> {
  const ordered = [...listingIds].sort((a, b) => a - b)
  for (let from = 0; from < ordered.length; from += BATCH) {
    const batch = ordered.slice(from, from + BATCH)
    const [gone] = await tx.execute(
      sql`DELETE FROM ${listingSearch} WHERE ${inArray(listingSearch.listingId, batch)} RETURNING counted_category AS category, counted_hil AS hil`,
    )
    const removed = (gone as unknown as Removed[]).filter(({ category }) => category > 0)
    await changeMapCells(
      tx,
      removed.map(({ category, hil }) => ({ categoryCode: category, hil, by: -1 })),
    )
  }
}
