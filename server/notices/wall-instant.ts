import { TZDate } from '@date-fns/tz'

/**
 * When a clock on the wall of `zone` shows this day ('2027-03-13') and time ('18:00'). A time that the clocks jump over
 * in spring is the same distance after the jump; one that comes twice in autumn is the first of the two.
 */
export function wallInstant(day: string, time: string, zone: string): Date {
  const [year = 0, month = 1, date = 1] = day.split('-').map(Number)
  const [hour = 0, minute = 0] = time.split(':').map(Number)
  return new Date(new TZDate(year, month - 1, date, hour, minute, 0, 0, zone).getTime())
}

const DAY_MS = 86_400_000

/** A calendar day some days on: days have no zone, so this is plain arithmetic. */
export function dayOn(day: string, days: number): string {
  return new Date(Date.parse(`${day}T00:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10)
}
