import { dateOfNumber, dayNumberOf, weekdayOfNumber } from '@/shared/domain/calendar/day-number'

/** Days on which a seller may choose to ship, Monday first. Worms and fish alike: no box waits over a weekend (common practice). */
export const shipDays = ['mon', 'tue', 'wed'] as const
export type ShipDay = (typeof shipDays)[number]

/** Days without carriers, by date 'YYYY-MM-DD', each with what is on. */
export type NoShipDays = ReadonlyMap<string, string>

export type ShipDayFaultCode =
  'not-a-ship-day' | 'holiday' | 'holiday-on-the-way' | 'arrives-on-holiday' | 'arrives-on-sunday'

export interface ShipDayFault {
  code: ShipDayFaultCode
  /** The date at fault. */
  day: string
  /** What is on that day, of a day without carriers. */
  why: string | null
}

export interface ShipDayRule {
  days: readonly ShipDay[]
  /** Nights on the way: 1 arrives the next day, 2 the day after. */
  nights: number
  noShipDays: NoShipDays
}

export interface JudgedShipDay {
  shipDay: string
  arriveDay: string
  /** Empty: a lawful day. */
  faults: readonly ShipDayFault[]
}

const SUNDAY = 6

/**
 * Whether live animals may leave on a date: one of the seller's days, no day without carriers from the counter to the
 * door, so that nothing arrives on one or on the day after it, and nothing arrives on a Sunday (common practice).
 * Throws RangeError for what is no date.
 */
export function judgeShipDay(shipDay: string, { days, nights, noShipDays }: ShipDayRule): JudgedShipDay {
  const start = dayNumberOf(shipDay)
  if (start === null) throw new RangeError(`${shipDay} is not a date of the calendar`)
  const arriveDay = dateOfNumber(start + nights)
  const faults: ShipDayFault[] = []
  const weekday = shipDays[weekdayOfNumber(start)]
  if (weekday === undefined || !days.includes(weekday))
    faults.push({ code: 'not-a-ship-day', day: shipDay, why: null })
  for (let gone = 0; gone <= nights; gone++) {
    const day = dateOfNumber(start + gone)
    const why = noShipDays.get(day)
    if (why === undefined) continue
    const code = gone === 0 ? 'holiday' : gone === nights ? 'arrives-on-holiday' : 'holiday-on-the-way'
    faults.push({ code, day, why })
  }
  if (weekdayOfNumber(start + nights) === SUNDAY)
    faults.push({ code: 'arrives-on-sunday', day: arriveDay, why: null })
  return { shipDay, arriveDay, faults }
}

/** House rule: further ahead nobody promises a day. */
export const SHIP_DAYS_AHEAD = 60

/** Lawful days from a date on, that date included, soonest first, at most `most` of the next 60 days. */
export function lawfulShipDays(fromDay: string, rule: ShipDayRule, most: number): JudgedShipDay[] {
  const start = dayNumberOf(fromDay)
  if (start === null) throw new RangeError(`${fromDay} is not a date of the calendar`)
  const found: JudgedShipDay[] = []
  for (let gone = 0; gone <= SHIP_DAYS_AHEAD && found.length < most; gone++) {
    const judged = judgeShipDay(dateOfNumber(start + gone), rule)
    if (judged.faults.length === 0) found.push(judged)
  }
  return found
}

/** The first lawful day from a date on. null: none in 60 days. */
export function nearestShipDay(fromDay: string, rule: ShipDayRule): JudgedShipDay | null {
  return lawfulShipDays(fromDay, rule, 1)[0] ?? null
}
