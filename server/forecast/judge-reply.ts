import type { ServiceReply } from './ask-service'

export interface ForecastDay {
  /** Calendar day at the place, 2027-01-15. */
  day: string
  minC: number
  maxC: number
}

export interface ForecastHour {
  at: Date
  airC: number
}

export interface JudgedReply {
  days: readonly ForecastDay[]
  hours: readonly ForecastHour[]
  zone: string
}

// Air outside these was never measured where people live; such a value is a fault of the service.
const COLDEST_C = -60
const HOTTEST_C = 60
const DAY_S = 86_400
const HOUR_S = 3_600

const isAirC = (value: number) => Number.isFinite(value) && value >= COLDEST_C && value <= HOTTEST_C

type Block = NonNullable<ServiceReply['daily']>

/** The block's moments, when it has as many values in each of its lists and all of them can be air. */
function momentsS({ fromS, untilS, stepS, lists }: Block, listCount: number): number[] | null {
  const count = Math.round((untilS - fromS) / stepS)
  const isWhole = lists.length === listCount && lists.every((list) => list.length === count)
  if (!isWhole || count < 1 || !lists.flat().every(isAirC)) return null
  return Array.from({ length: count }, (_, at) => fromS + at * stepS)
}

/**
 * The reply as days and hours, or null when it cannot be a forecast. The service cuts its days at one UTC offset, the
 * one in force while it answers, so a day is named by that offset and has 24 hours even when the clocks change in it.
 */
export function judgeReply({ zone, offsetS, daily, hourly }: ServiceReply): JudgedReply | null {
  if (!daily || !hourly || daily.stepS !== DAY_S || hourly.stepS !== HOUR_S) return null
  if (zone === '' || Math.abs(offsetS) > 14 * HOUR_S) return null
  const dayTimes = momentsS(daily, 2)
  const hourTimes = momentsS(hourly, 1)
  const [lows = [], highs = []] = daily.lists
  const [air = []] = hourly.lists
  if (!dayTimes || !hourTimes || lows.some((low, at) => low > (highs[at] ?? low))) return null
  return {
    zone,
    days: dayTimes.map((fromS, at) => ({
      day: new Date((fromS + offsetS) * 1000).toISOString().slice(0, 10),
      minC: lows[at] ?? NaN,
      maxC: highs[at] ?? NaN,
    })),
    hours: hourTimes.map((fromS, at) => ({ at: new Date(fromS * 1000), airC: air[at] ?? NaN })),
  }
}
