import { dayNumberOf } from '@/shared/domain/calendar/day-number'
import type { SourceKey } from '@/shared/sources'

/** High-volume seller: so many sales and so much gross in any twelve months of the last twenty-four (FTC guidance). */
export const informLine = { sales: 200, grossCents: 500_000 } as const
/** Days to give the details, and again to have them checked. */
export const INFORM_DAYS = 10
export const informSource: SourceKey = 'inform-act'

export interface Sale {
  /** 'YYYY-MM-DD'. */
  day: string
  grossCents: number
}

export interface InformCount {
  /** Of the fullest window. */
  sales: number
  grossCents: number
  /** The first day on which both lines were reached in one window. null: never. */
  reachedOn: string | null
}

const DAYS_A_YEAR = 365
const TWO_YEARS = 2 * DAYS_A_YEAR + 1

/**
 * The fullest twelve months of the last twenty-four, by gross, and the day on which a window first reached both lines.
 * Sales in any order; a day that is none of the calendar throws RangeError.
 */
export function informCount(sales: readonly Sale[], today: string): InformCount {
  const now = numberOf(today)
  const dated = sales
    .map((sale) => ({ ...sale, at: numberOf(sale.day) }))
    .filter(({ at }) => at <= now && at > now - TWO_YEARS)
    .sort((a, b) => a.at - b.at)
  let [first, grossCents] = [0, 0]
  let [fullestSales, fullestCents] = [0, 0]
  let reachedOn: string | null = null
  dated.forEach((sale, last) => {
    grossCents += sale.grossCents
    while ((dated[first]?.at ?? now) <= sale.at - DAYS_A_YEAR) {
      grossCents -= dated[first]?.grossCents ?? 0
      first += 1
    }
    const count = last - first + 1
    if (grossCents > fullestCents) [fullestSales, fullestCents] = [count, grossCents]
    if (reachedOn === null && count >= informLine.sales && grossCents >= informLine.grossCents)
      reachedOn = sale.day
  })
  return { sales: fullestSales, grossCents: fullestCents, reachedOn }
}

function numberOf(day: string): number {
  const number = dayNumberOf(day)
  if (number === null) throw new RangeError(`${day} is not a date of the calendar`)
  return number
}
