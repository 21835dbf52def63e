import { getTableColumns, inArray, ne, or, sql, type SQL } from 'drizzle-orm'

import type { Tx } from '@/db/client'
import { listingSearch } from '@/db/schema/listing-search'
import { changeMapCells } from '@/server/search/map-cell-store'
import { searchColumns } from '@/server/search/search-columns'
import type { SearchRow } from '@/server/search/search-row'

const BATCH = 200

/** Everything but the key and what the map has counted. */
function overwriting(): Record<string, SQL> {
  const {
    listingId: _key,
    countedCategory: _counted,
    countedHil: _at,
    ...facts
  } = getTableColumns(listingSearch)
  return Object.fromEntries(Object.entries(facts).map(([name, column]) => [name, sql`VALUES(${column})`]))
}
const overwrite = overwriting()

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
    await tx.insert(listingSearch).values(batch.map(searchColumns)).onDuplicateKeyUpdate({ set: overwrite })
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
