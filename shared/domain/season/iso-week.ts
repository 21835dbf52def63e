import { dayOfYear } from '@/shared/domain/climate/day-of-year'

/** ISO week of a date 'YYYY-MM-DD', 1 to 53: Monday-based, the first holds 4 January. null: not a date of the calendar. */
export function isoWeekOf(date: string): number | null {
  if (dayOfYear(date) === null) return null
  const [year = NaN, month = NaN, day = NaN] = date.split('-').map(Number)
  const days = daysBefore(year, month, day)
  // 1 January of year 1 was a Monday.
  const weekday = days % 7
  const thursday = days - weekday + 3
  const yearOfThursday =
    thursday < daysBefore(year, 1, 1) ? year - 1 : thursday >= daysBefore(year + 1, 1, 1) ? year + 1 : year
  return Math.floor((thursday - daysBefore(yearOfThursday, 1, 1)) / 7) + 1
}

/** Days from 1 January of year 1 to this date. */
function daysBefore(year: number, month: number, day: number): number {
  const past = year - 1
  const isLeap = year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0)
  const months = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334]
  return (
    past * 365 +
    Math.floor(past / 4) -
    Math.floor(past / 100) +
    Math.floor(past / 400) +
    (months[month - 1] ?? NaN) +
    (isLeap && month > 2 ? 1 : 0) +
    day -
    1
  )
}
