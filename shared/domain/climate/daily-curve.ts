import { monthDays } from '@/shared/domain/climate/day-of-year'
import type { Months } from '@/shared/domain/climate/month-normals'

const YEAR = 365
const PASSES = 8

const starts = monthDays.map((_, month) => monthDays.slice(0, month).reduce((sum, days) => sum + days, 0))
const middles = monthDays.map((days, month) => (starts[month] ?? 0) + (days - 1) / 2)

/**
 * Twelve monthly means → 365 daily values: straight lines between the middles of the months, whose anchors are moved
 * until every month keeps its mean (eight passes; to 0.001 °C on the stations it was tried on).
 */
export function dailyCurve(months: Months): number[] {
  let anchors = [...months]
  for (let pass = 0; pass < PASSES; pass++) {
    const days = straightLines(anchors)
    anchors = anchors.map((anchor, month) => anchor + (months[month] ?? NaN) - meanOfMonth(days, month))
  }
  return straightLines(anchors)
}

function meanOfMonth(days: readonly number[], month: number): number {
  const [start, length] = [starts[month] ?? 0, monthDays[month] ?? 0]
  return days.slice(start, start + length).reduce((sum, value) => sum + value, 0) / length
}

/** For each day the middles of months it lies between, and how far along. */
const places = Array.from({ length: YEAR }, (_, day) => {
  const after = middles.findIndex((middle) => middle >= day)
  const [to, from] = [after === -1 ? 0 : after, after === -1 ? 11 : (after + 11) % 12]
  const [start, end] = [middles[from] ?? NaN, middles[to] ?? NaN]
  const span = (end - start + YEAR) % YEAR
  return { from, to, share: ((day - start + YEAR) % YEAR) / span }
})

function straightLines(anchors: Months): number[] {
  return places.map(
    ({ from, to, share }) => (anchors[from] ?? NaN) + share * ((anchors[to] ?? NaN) - (anchors[from] ?? NaN)),
  )
}
