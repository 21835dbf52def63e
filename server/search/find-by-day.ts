import { findOutwards } from '@/server/search/find-in-circle'
import type { FoundRow } from '@/server/search/found-row'
import type { SearchQuery } from '@/server/search/search-query'
import { firstDaySql, whole } from '@/server/search/search-sql'

const MOST_DAYS = 3

/** The same wishes, but had on this very day. Sizes the circles of `findByDay`. */
export function onDay(query: SearchQuery, day: number): SearchQuery {
  return { ...query, sort: 'nearest', days: { from: day, until: day } }
}

/**
 * Soonest first, for a date far enough ahead that most listings can be had by then: the first day alone fills a
 * page, so its nearest listings are read outwards, then those of the next day. `rows` null: the days were so thin
 * that the whole circle is read sooner.
 */
export async function findByDay(
  query: SearchQuery & { days: NonNullable<SearchQuery['days']> },
  firstKm: number,
): Promise<{ rows: FoundRow[] | null; trips: number }> {
  const { days, after, limit } = query
  const start = after?.by ?? days.from
  const found: FoundRow[] = []
  let trips = 0
  for (let day = start; day <= days.until && day < start + MOST_DAYS; day++) {
    const sameDay: SearchQuery = {
      ...query,
      sort: 'nearest',
      limit: limit - found.length,
      after: day === after?.by ? { ...after, by: after.dm2 } : undefined,
    }
    const step = await findOutwards(sameDay, { firstKm, also: [`${firstDaySql(query)}=${whole(day)}`] })
    trips += step.trips
    found.push(...step.rows.map((row) => ({ ...row, sortBy: day })))
    if (found.length >= limit) return { rows: found, trips }
  }
  return { rows: start + MOST_DAYS > days.until ? found : null, trips }
}
