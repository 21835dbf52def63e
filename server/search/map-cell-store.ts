import { sql } from 'drizzle-orm'

import type { Tx } from '@/db/client'
import { HILBERT_BITS, hilbertCentre } from '@/shared/domain/geo/hilbert'
import type { HilbertRange } from '@/shared/domain/geo/hilbert-cover'
import { categoryCodes } from '@/server/search/category-codes'
import { MAP_LEVELS } from '@/server/search/map-levels'
import { readSearchRows } from '@/server/search/read-search-store'
import { rangesSql, whole } from '@/server/search/search-sql'

/** So many listings more (or fewer, if negative) at a place along the Hilbert curve. */
export interface MapChange {
  categoryCode: number
  hil: number
  by: number
}

export interface SummedMark {
  key: string
  count: number
  sumLatE6: number
  sumLngE6: number
}

interface CellSum {
  lvl: number
  categoryCode: number
  cell: number
  n: number
  sumLatE6: number
  sumLngE6: number
}

const BATCH = 500

/**
 * Adds and takes listings to and from the summed marks. In one order for everybody, so that two writers wait for
 * each other instead of deadlocking.
 */
export async function changeMapCells(tx: Tx, changes: readonly MapChange[]): Promise<void> {
  const sums = new Map<number, CellSum>()
  for (const { categoryCode, hil, by } of changes) {
    const { lat, lng } = hilbertCentre(hil)
    for (const lvl of MAP_LEVELS) {
      const cell = Math.floor(hil / 4 ** (HILBERT_BITS - lvl))
      // Level and category beside 26 bits of cell: one number, as text keys cost more than the sums.
      const key = (lvl * 256 + categoryCode) * 4 ** 13 + cell
      const sum = sums.get(key) ?? { lvl, categoryCode, cell, n: 0, sumLatE6: 0, sumLngE6: 0 }
      sum.n += by
      sum.sumLatE6 += by * Math.round(lat * 1e6)
      sum.sumLngE6 += by * Math.round(lng * 1e6)
      sums.set(key, sum)
    }
  }
  const rows = [...sums.values()]
    .filter(({ n, sumLatE6, sumLngE6 }) => n !== 0 || sumLatE6 !== 0 || sumLngE6 !== 0)
    .sort((a, b) => a.lvl - b.lvl || a.categoryCode - b.categoryCode || a.cell - b.cell)
  for (let from = 0; from < rows.length; from += BATCH) {
    const values = rows
      .slice(from, from + BATCH)
      .map(
        (row) =>
          `(${[row.lvl, row.categoryCode, row.cell, row.n, row.sumLatE6, row.sumLngE6].map(whole).join(',')})`,
      )
    await tx.execute(
      sql.raw(
        `INSERT INTO map_cell (lvl,category,cell,n,sum_lat_e_6,sum_lng_e_6) VALUES ${values.join(',')} ON DUPLICATE KEY UPDATE n=n+VALUES(n),sum_lat_e_6=sum_lat_e_6+VALUES(sum_lat_e_6),sum_lng_e_6=sum_lng_e_6+VALUES(sum_lng_e_6)`,
      ),
    )
  }
}

const categorySql = (categoryCode: number | undefined) =>
  `category IN (${(categoryCode === undefined ? categoryCodes : [categoryCode]).map(whole).join(',')})`

const markOf = (key: string, [count = 0, sumLatE6 = 0, sumLngE6 = 0]: readonly number[]): SummedMark => ({
  key,
  count,
  sumLatE6,
  sumLngE6,
})

export async function readClusters(
  level: number,
  ranges: readonly HilbertRange[],
  categoryCode?: number,
): Promise<SummedMark[]> {
  const size = 4 ** (HILBERT_BITS - level)
  const cells = ranges.map(({ from, to }) => ({ from: Math.floor(from / size), to: Math.floor(to / size) }))
  const rows = await readSearchRows(
    `SELECT SUM(n),SUM(sum_lat_e_6),SUM(sum_lng_e_6),cell FROM map_cell WHERE lvl=${whole(level)} AND ${categorySql(categoryCode)} AND ${rangesSql('cell', cells)} AND n>0 GROUP BY cell`,
  )
  return rows.map((row) => markOf(String(row[3]), row.map(Number)))
}

export async function readPlaces(
  ranges: readonly HilbertRange[],
  categoryCode?: number,
): Promise<SummedMark[]> {
  const rows = await readSearchRows(
    `SELECT COUNT(*),SUM(lat_e_6),SUM(lng_e_6),lat_e_6,lng_e_6 FROM listing_search FORCE INDEX (PRIMARY) WHERE ${categorySql(categoryCode)} AND ${rangesSql('hil', ranges)} GROUP BY lat_e_6,lng_e_6`,
  )
  return rows.map((row) => markOf(`${row[3]}.${row[4]}`, row.map(Number)))
}
