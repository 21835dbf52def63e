import { searchOrder } from '@/server/search/search-order'
import type { SearchQuery } from '@/server/search/search-query'

/** One row as search reads it. */
export interface FoundRow {
  listingId: number
  dm2: number
  unitCents: number
  sortBy: number
}

/** Columns in the order of `selectedSql`. */
export function readFoundRows(query: SearchQuery, rows: readonly (readonly number[])[]): FoundRow[] {
  const { column } = searchOrder(query)
  return rows.map(([listingId = 0, dm2 = 0, unitCents = 0, sortBy = 0]) => ({
    listingId,
    dm2,
    unitCents,
    sortBy: { dm2, unit_cents: unitCents, sort_by: sortBy }[column],
  }))
}
