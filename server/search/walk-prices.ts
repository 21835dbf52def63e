import { readFoundRows, type FoundRow } from '@/server/search/found-row'
import { readSearchRows } from '@/server/search/read-search-store'
import { afterSql, selectedSql } from '@/server/search/search-order'
import type { SearchQuery } from '@/server/search/search-query'
import { insideSql, priceSql, whole, wishSql } from '@/server/search/search-sql'

/** Where a walk stands in one category: every row behind it has been seen. */
interface Footprint {
  categoryCode: number
  smallPrice: number
  listingId: number
  /** No row lies ahead. */
  ended: boolean
}

interface Walked {
  row: FoundRow
  smallPrice: number
}

interface Stride {
  rows: number
  /** A page is full up to this price: nothing dearer is worth reading. */
  mostCents?: number
}

/** Text of the next rows upwards in one category. */
export function priceStepSql(query: SearchQuery, at: Omit<Footprint, 'ended'>, stride: Stride): string {
  const { categoryCode, smallPrice, listingId } = at
  const { rows, mostCents } = stride
  const worthReading =
    mostCents === undefined
      ? []
      : [`small_price<=${whole(mostCents)}`, `${priceSql(query)}<=${whole(mostCents)}`]
  const price = whole(smallPrice)
  const tests = [
    `category=${whole(categoryCode)}`,
    `small_price>=${price}`,
    `(small_price>${price} OR listing_id>${whole(listingId)})`,
    ...(query.speciesCode === undefined ? [] : [`species=${whole(query.speciesCode)}`]),
    insideSql(query, query.radiusKm),
    ...wishSql(query),
    ...afterSql(query),
    ...worthReading,
  ]
  return `(SELECT ${selectedSql(query)},small_price,category FROM listing_search FORCE INDEX (k_price) WHERE ${tests.join(' AND ')} ORDER BY small_price,listing_id LIMIT ${whole(rows)})`
}

async function step(query: SearchQuery, ahead: Footprint[], stride: Stride): Promise<Walked[]> {
  const read = await readSearchRows(ahead.map((at) => priceStepSql(query, at, stride)).join(' UNION ALL '))
  for (const at of ahead) {
    const mine = read.filter((columns) => columns[5] === at.categoryCode)
    // UNION ALL keeps no order between its parts, nor is it promised within one.
    for (const columns of mine) {
      const [listingId = 0, , , , smallPrice = 0] = columns
      if (smallPrice > at.smallPrice || (smallPrice === at.smallPrice && listingId > at.listingId)) {
        at.smallPrice = smallPrice
        at.listingId = listingId
      }
    }
    at.ended = mine.length < stride.rows
  }
  return readFoundRows(query, read).map((row, index) => ({ row, smallPrice: read[index]?.[4] ?? 0 }))
}

const byPrice = (a: Walked, b: Walked) => a.row.sortBy - b.row.sortBy || a.row.listingId - b.row.listingId

const hasPassed = ({ smallPrice, listingId }: Footprint, last: FoundRow) =>
  smallPrice > last.sortBy || (smallPrice === last.sortBy && listingId >= last.listingId)

/**
 * Cheapest first without reading the circle. The index stands in order of `small_price`, which no order of everyday
 * size undercuts; so once the walk has passed the last row of the page, nothing ahead can belong on it.
 */
export async function walkPrices(
  query: SearchQuery,
  categories: readonly number[],
): Promise<{ rows: FoundRow[]; trips: number }> {
  const feet = categories.map((categoryCode) => ({ categoryCode, smallPrice: 0, listingId: 0, ended: false }))
  let walked: Walked[] = []
  for (let trips = 1, rows = query.limit + 8; ; trips++, rows *= 3) {
    const mostCents = walked[query.limit - 1]?.row.sortBy
    const ahead = feet.filter((at) => !at.ended)
    walked = [...walked, ...(await step(query, ahead, { rows, mostCents }))].sort(byPrice)
    const last = walked[query.limit - 1]?.row
    for (const at of feet) at.ended ||= last !== undefined && hasPassed(at, last)
    if (feet.every((at) => at.ended))
      return { rows: walked.slice(0, query.limit).map(({ row }) => row), trips }
  }
}
