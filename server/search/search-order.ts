import { chordSql, firstDaySql, priceSql, whole } from '@/server/search/search-sql'
import type { SearchQuery } from '@/server/search/search-query'

/** What rows are sorted by, before the listing number settles ties. */
export interface SearchOrder {
  /** Value of the sort asked for. */
  by: string
  /** Its name among the columns read. */
  column: 'dm2' | 'unit_cents' | 'sort_by'
  /** Whether rows with equal `by` come nearest first; prices do not, so that the walk by price can stop early. */
  thenNearest: boolean
}

export function searchOrder(query: SearchQuery): SearchOrder {
  switch (query.sort) {
    case 'nearest':
      return { by: chordSql(query), column: 'dm2', thenNearest: false }
    case 'cheapest':
      return { by: priceSql(query), column: 'unit_cents', thenNearest: false }
    case 'soonest':
      return { by: firstDaySql(query), column: 'sort_by', thenNearest: true }
    case 'best-rated':
      return { by: 'rating_rank', column: 'sort_by', thenNearest: true }
  }
}

/** Strictly later than the last hit of the page before. Whole numbers on both sides: no row is met twice or missed. */
export function afterSql(query: SearchQuery): string[] {
  const { after } = query
  if (!after) return []
  const { by, thenNearest } = searchOrder(query)
  const id = `listing_id>${whole(after.listingId)}`
  const chord = chordSql(query)
  const dm2 = whole(after.dm2)
  const tie = thenNearest ? `(${chord}>${dm2} OR (${chord}=${dm2} AND ${id}))` : id
  return [`(${by}>${whole(after.by)} OR (${by}=${whole(after.by)} AND ${tie}))`]
}

/** ORDER BY over the names of `selectedSql`. */
export function orderSql(query: SearchQuery): string {
  const { column, thenNearest } = searchOrder(query)
  return thenNearest ? `${column},dm2,listing_id` : `${column},listing_id`
}

/** The columns every search reads. Distance and price are long texts, so they are not said twice. */
export function selectedSql(query: SearchQuery): string {
  const { by, column } = searchOrder(query)
  return `listing_id,${chordSql(query)} AS dm2,${priceSql(query)} AS unit_cents,${column === 'sort_by' ? by : '0'} AS sort_by`
}
