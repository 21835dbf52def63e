import { squaredChordOfKm, earthPoint } from '@/shared/domain/geo/earth-point'
import type { HilbertRange } from '@/shared/domain/geo/hilbert-cover'
import { stateBit } from '@/shared/domain/rules/state-bits'
import { dayMask } from '@/server/search/open-days'
import type { SearchQuery } from '@/server/search/search-query'
import { MORE_TIERS } from '@/server/search/tier-columns'

/**
 * Search text is built from whole numbers only, so nothing typed by anybody can reach it; this is the gate.
 * Placeholders would cost a prepared statement for each number of ranges.
 */
export function whole(value: number | bigint): string {
  if (typeof value !== 'bigint' && !Number.isSafeInteger(value))
    throw new RangeError(`${value} is no whole number`)
  return String(value)
}

/** Squared chord from the origin, dm². */
export function chordSql({ origin }: SearchQuery): string {
  const { x, y, z } = earthPoint(origin)
  const square = (axis: string, at: number) => {
    const off = at < 0 ? `(${axis}+${whole(-at)})` : `(${axis}-${whole(at)})`
    return `${off}*${off}`
  }
  return `(${square('x', x)}+${square('y', y)}+${square('z', z)})`
}

/** The fifth to eighth price, written as digits; what is not used holds a count that nobody orders. */
function moreTiersSql(count: string): string {
  const { most, countDigits, centsDigits } = MORE_TIERS
  const start = (tier: number) => tier * (countDigits + centsDigits) + 1
  const cents = (tier: number) =>
    tier < 0 ? 'price4' : `SUBSTR(more_tiers,${start(tier) + countDigits},${centsDigits})+0`
  let text = cents(most - 1)
  for (let tier = most - 1; tier >= 0; tier--) {
    text = `IF(${count}<SUBSTR(more_tiers,${start(tier)},${countDigits})+0,${cents(tier - 1)},${text})`
  }
  return `IF(more_tiers='',price4,${text})`
}

/** Cents for one at the count asked, else at the listing's smallest order. */
export function priceSql({ count }: SearchQuery): string {
  const n = count === undefined ? 'min_qty' : whole(count)
  return `IF(${n}<from2,price1,IF(${n}<from3,price2,IF(${n}<from4,price3,${moreTiersSql(n)})))`
}

/** The first day from the day asked on at which it can be had. */
export function firstDaySql({ days }: SearchQuery): string {
  if (!days) return 'next_day'
  const turn = days.from % 64
  // Day `from` becomes bit 0; the lowest bit set is then counted by the ones below it.
  const turned = turn === 0 ? 'open_days' : `((open_days>>${turn})|(open_days<<${64 - turn}))`
  return `IF(next_day>=${whole(days.from)},next_day,${whole(days.from)}+BIT_COUNT((${turned}^(${turned}-1))>>1))`
}

const laneSql = (lanes: readonly number[]) => `lane IN (${lanes.map(whole).join(',')})`

function handoverSql({ pickup, lanes }: NonNullable<SearchQuery['handover']>): string {
  const ways = [...(pickup ? ['pickup=1'] : []), ...(lanes.length > 0 ? [laneSql(lanes)] : [])]
  return ways.length > 0 ? `(${ways.join(' OR ')})` : 'FALSE'
}

/** The bit first: it is cheaper to test than the list. */
function shippedSql({ lanes, state }: NonNullable<SearchQuery['shipped']>): string[] {
  const bit = stateBit(state)
  return bit === null || lanes.length === 0 ? ['FALSE'] : [`(ship_states&${whole(bit)})<>0`, laneSql(lanes)]
}

/** Every wish except place, category and species, as conditions on one row. */
export function wishSql(query: SearchQuery): string[] {
  const { sizeMm, count, days, mostCents, handover, shipped, buyerState } = query
  const wishes: string[] = []
  if (count !== undefined) wishes.push(`min_qty<=${whole(count)}`, `qty>=${whole(count)}`)
  if (sizeMm) wishes.push(`size_lo_mm<=${whole(sizeMm.to)}`, `size_hi_mm>=${whole(sizeMm.from)}`)
  if (days) {
    wishes.push(`last_day>=${whole(days.from)}`, `next_day<=${whole(days.until)}`)
    const mask = dayMask(days)
    if (mask !== null) wishes.push(`(open_days&${whole(mask)})<>0`)
  }
  if (handover) wishes.push(handoverSql(handover))
  if (shipped) wishes.push(...shippedSql(shipped))
  const hidden = buyerState === undefined ? null : stateBit(buyerState)
  if (hidden !== null) wishes.push(`(hidden_states&${whole(hidden)})=0`)
  if (mostCents !== undefined) wishes.push(`${priceSql(query)}<=${whole(mostCents)}`)
  return wishes
}

/** No ranges (a circle that earlier pages have whole, a view off the world): no rows. */
export function rangesSql(column: string, ranges: readonly HilbertRange[]): string {
  if (ranges.length === 0) return 'FALSE'
  return `(${ranges.map(({ from, to }) => `${column} BETWEEN ${whole(from)} AND ${whole(to)}`).join(' OR ')})`
}

/** Inside the circle, both by index ranges and exactly. */
export function circleSql(query: SearchQuery, ranges: readonly HilbertRange[], radiusKm: number): string[] {
  return [rangesSql('hil', ranges), insideSql(query, radiusKm)]
}

export function insideSql(query: SearchQuery, radiusKm: number): string {
  return `${chordSql(query)}<=${whole(squaredChordOfKm(radiusKm))}`
}
