import { circleCover } from '@/shared/domain/geo/circle-cover'
import type { HilbertRange } from '@/shared/domain/geo/hilbert-cover'
import { kmOfSquaredChord } from '@/shared/domain/geo/earth-point'
import { categoryCodes } from '@/server/search/category-codes'
import { readSearchRows } from '@/server/search/read-search-store'
import { readFoundRows, type FoundRow } from '@/server/search/found-row'
import { afterSql, orderSql, selectedSql } from '@/server/search/search-order'
import { WIDE_KM } from '@/server/search/near-lanes'
import type { SearchQuery } from '@/server/search/search-query'
import { circleSql, insideSql, whole, wishSql } from '@/server/search/search-sql'

/** Ranges of the index by lane: each costs the planner of the database some microseconds, each square saved some rows. */
const LANE_RANGES = 64
const QUADS = { least: 2, most: 48 } as const

function coverOf(query: SearchQuery, ring: { radiusKm: number; beyondKm: number }): HilbertRange[] {
  const lanes = query.shipped?.lanes.length ?? 0
  const quads = lanes === 0 ? QUADS.most : Math.round(LANE_RANGES / lanes)
  return circleCover({ centre: query.origin, ...ring }, Math.min(QUADS.most, Math.max(QUADS.least, quads)))
}

/**
 * Index and leading conditions: by lane where only some are asked for, as few listings go by them; by species where one
 * is named; else by category.
 */
export function classSql({ categoryCode, speciesCode, shipped }: SearchQuery): {
  index: string
  where: string[]
} {
  const category =
    categoryCode === undefined
      ? `category IN (${categoryCodes.map(whole).join(',')})`
      : `category=${whole(categoryCode)}`
  const index = shipped ? 'k_lane' : speciesCode === undefined ? 'PRIMARY' : 'k_species'
  if (speciesCode === undefined) return { index, where: [category] }
  const species = `species=${whole(speciesCode)}`
  return { index, where: categoryCode === undefined ? [species] : [species, category] }
}

/** Text of one page inside a circle of the query's centre; for `nearest`, without what earlier pages hold. */
export function circlePageSql(query: SearchQuery, radiusKm: number, also: readonly string[] = []): string {
  const beyondKm = query.sort === 'nearest' && query.after ? kmOfSquaredChord(query.after.dm2) : 0
  // Most of the country and a hundred lanes: ranges of place would cost more than they save.
  const isByLane = query.shipped !== undefined && radiusKm > WIDE_KM
  const place = isByLane
    ? [insideSql(query, radiusKm)]
    : circleSql(query, coverOf(query, { radiusKm, beyondKm }), radiusKm)
  const { index, where } = classSql(query)
  const tests = [
    ...where,
    ...(isByLane ? [...wishSql(query), ...place] : [...place, ...wishSql(query)]),
    ...also,
    ...afterSql(query),
  ]
  return `SELECT ${selectedSql(query)} FROM listing_search FORCE INDEX (${index}) WHERE ${tests.join(' AND ')} ORDER BY ${orderSql(query)} LIMIT ${whole(query.limit)}`
}

export async function findInCircle(
  query: SearchQuery,
  radiusKm: number,
  also: readonly string[] = [],
): Promise<FoundRow[]> {
  return readFoundRows(query, await readSearchRows(circlePageSql(query, radiusKm, also)))
}

export interface Outwards {
  firstKm: number
  /** More conditions than the query's own. */
  also?: readonly string[]
}

/** Reads growing circles. A full page inside a circle is the nearest page there is, so nothing needs remembering. */
export async function findOutwards(
  query: SearchQuery,
  { firstKm, also }: Outwards,
): Promise<{ rows: FoundRow[]; trips: number }> {
  let km = firstKm
  for (let trips = 1; ; trips++) {
    const rows = await findInCircle(query, km, also)
    if (rows.length >= query.limit || km >= query.radiusKm) return { rows, trips }
    const growth = rows.length === 0 ? 8 : Math.max(2, Math.sqrt((query.limit * 1.5) / rows.length))
    km = Math.min(query.radiusKm, km * growth)
  }
}
