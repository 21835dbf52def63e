import { readFoundRows, type FoundRow } from '@/server/search/found-row'
import { readSearchRows } from '@/server/search/read-search-store'
import { afterSql, orderSql, searchOrder, selectedSql } from '@/server/search/search-order'
import type { SearchQuery } from '@/server/search/search-query'
import { UNRATED_RANK } from '@/server/search/search-row'
import { insideSql, whole, wishSql } from '@/server/search/search-sql'

/** The index of the sort and its column, which never exceeds what rows are sorted by. */
function ladder(query: SearchQuery): { index: string; rung: string; from: string[] } {
  const { after, days } = query
  if (query.sort === 'best-rated') {
    return { index: 'k_rated', rung: 'rating_rank', from: after ? [`rating_rank>=${whole(after.by)}`] : [] }
  }
  if (!after) return { index: 'k_soonest', rung: 'next_day', from: [] }
  // A row whose first day is long past may still be had on any later day.
  const early = days ? `next_day<${whole(days.from)} OR ` : ''
  return { index: 'k_soonest', rung: 'next_day', from: [`(${early}next_day>=${whole(after.by)})`] }
}

function conditions(query: SearchQuery, category: string): string {
  return [
    category,
    ...ladder(query).from,
    ...(query.speciesCode === undefined ? [] : [`species=${whole(query.speciesCode)}`]),
    insideSql(query, query.radiusKm),
    ...wishSql(query),
    ...afterSql(query),
  ].join(' AND ')
}

/** Text of a first walk: how far up a page reaches in one category. */
export function rankProbeSql(query: SearchQuery, categoryCode: number): string {
  const { index, rung } = ladder(query)
  const where = conditions(query, `category=${whole(categoryCode)}`)
  return `(SELECT ${searchOrder(query).by} FROM listing_search FORCE INDEX (${index}) WHERE ${where} ORDER BY ${rung} LIMIT ${whole(query.limit)})`
}

/**
 * Soonest or best rated first without reading the circle. Ties are settled by distance, which the index does not
 * know, so a first walk finds how far up a page reaches and a second one sorts what lies below. null: that is so
 * far that the circle is read sooner.
 */
export async function walkRanks(
  query: SearchQuery,
  categories: readonly number[],
): Promise<FoundRow[] | null> {
  const probe = await readSearchRows(categories.map((code) => rankProbeSql(query, code)).join(' UNION ALL '))
  const reached = probe.map(([by = 0]) => by).sort((a, b) => a - b)
  const top = reached[query.limit - 1]
  // Unrated sellers are half of all, on one rung.
  if (top === undefined || (query.sort === 'best-rated' && top >= UNRATED_RANK)) return null
  const { index, rung } = ladder(query)
  const where = conditions(query, `category IN (${categories.map(whole).join(',')})`)
  const sql = `SELECT ${selectedSql(query)} FROM listing_search FORCE INDEX (${index}) WHERE ${where} AND ${rung}<=${whole(top)} ORDER BY ${orderSql(query)} LIMIT ${whole(query.limit)}`
  return readFoundRows(query, await readSearchRows(sql))
}
