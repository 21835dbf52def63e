import { chordSql, firstDaySql, priceSql, whole } from '@/server/search/search-sql'
import type { SearchQuery } from '@/server/search/search-query'

/** What rows are sorted by, before the listing number settles ties. */
export interface SearchOrder {
  /** Value of the sort asked for. */
  by: string
  /** Whether rows with equal `by` come nearest first; prices do not, so that the walk by price can stop early. */
  thenNearest: boolean
}

export function searchOrder(query: SearchQuery): SearchOrder {
  switch (query.sort) {
    case 'nearest':
      return { by: chordSql(query), thenNearest: false }
    case 'cheapest':
      return { by: priceSql(query), thenNearest: false }
    case 'soonest':
      return { by: firstDaySql(query), thenNearest: true }
    case 'best-rated':
      return { by: 'rating_rank', thenNearest: true }
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

/** ORDER BY over the names of `SELECTED`. */
export function orderSql(query: SearchQuery): string {
  return searchOrder(query).thenNearest ? 'sort_by,dm2,listing_id' : 'sort_by,listing_id'
}

/** The columns every search reads. */
export function selectedSql(query: SearchQuery): string {
  return `listing_id,${chordSql(query)} AS dm2,${priceSql(query)} AS unit_cents,${searchOrder(query).by} AS sort_by`
}
