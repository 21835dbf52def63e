import { readFoundRows, type FoundRow } from '@/server/search/found-row'
import type { Ladder } from '@/server/search/ladder'
import { readSearchRows } from '@/server/search/read-search-store'
import { afterSql, orderSql, selectedSql } from '@/server/search/search-order'
import type { SearchQuery } from '@/server/search/search-query'
import { insideSql, whole, wishSql } from '@/server/search/search-sql'

/** More of the ladder when a page was not full. */
const GROWTH = 4
const MOST_TRIPS = 3

export interface RankWalk {
  categories: readonly number[]
  firstRung: number
}

/** The index of the sort and its column, which never exceeds what rows are sorted by. */
function rungSql(query: SearchQuery): { index: string; rung: string; from: string[] } {
  const { after, days } = query
  if (query.sort === 'best-rated') {
    return { index: 'k_rated', rung: 'rating_rank', from: after ? [`rating_rank>=${whole(after.by)}`] : [] }
  }
  if (!after) return { index: 'k_soonest', rung: 'next_day', from: [] }
  // A row whose first day is long past may still be had on any later day.
  const early = days ? `next_day<${whole(days.from)} OR ` : ''
  return { index: 'k_soonest', rung: 'next_day', from: [`(${early}next_day>=${whole(after.by)})`] }
}

/** Text of one page among the rungs up to `top`. */
export function rankPageSql(query: SearchQuery, categories: readonly number[], top: number): string {
  const { index, rung, from } = rungSql(query)
  const tests = [
    `category IN (${categories.map(whole).join(',')})`,
    `${rung}<=${whole(top)}`,
    ...from,
    ...(query.speciesCode === undefined ? [] : [`species=${whole(query.speciesCode)}`]),
    insideSql(query, query.radiusKm),
    ...wishSql(query),
    ...afterSql(query),
  ]
  return `SELECT ${selectedSql(query)} FROM listing_search FORCE INDEX (${index}) WHERE ${tests.join(' AND ')} ORDER BY ${orderSql(query)} LIMIT ${whole(query.limit)}`
}

/**
 * Soonest or best rated first without reading the circle: all rows up to a rung are read, and a full page that does
 * not go beyond that rung is the page there is. `rows` null: it would take so many rungs that the circle is read
 * sooner.
 */
export async function walkRanks(
  query: SearchQuery,
  { categories, firstRung }: RankWalk,
  ladder: Ladder,
): Promise<{ rows: FoundRow[] | null; trips: number }> {
  let top = firstRung
  for (let trips = 1; ; trips++) {
    const rows = readFoundRows(query, await readSearchRows(rankPageSql(query, categories, top)))
    const last = rows[query.limit - 1]
    // A row may be sorted higher than its rung; what is sorted above `top` could be beaten by a row not read.
    if (last && last.sortBy <= top) return { rows, trips }
    const next = ladder.reaching(categories, ladder.upTo(categories, top) * GROWTH)
    if (trips >= MOST_TRIPS || next === null || next <= top) return { rows: null, trips }
    top = next
  }
}
