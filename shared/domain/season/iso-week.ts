import { dayNumberOf, weekdayOfNumber } from '@/shared/domain/calendar/day-number'

/** ISO week of a date 'YYYY-MM-DD', 1 to 53: Monday-based, the first holds 4 January. null: not a date of the calendar. */
export function isoWeekOf(date: string): number | null {
  const days = dayNumberOf(date)
  if (days === null) return null
  const year = Number(date.slice(0, 4))
  const thursday = days - weekdayOfNumber(days) + 3
  const yearOfThursday = thursday < newYear(year) ? year - 1 : thursday >= newYear(year + 1) ? year + 1 : year
  return Math.floor((thursday - newYear(yearOfThursday)) / 7) + 1
}

const newYear = (year: number) => dayNumberOf(`${String(year).padStart(4, '0')}-01-01`) ?? -366
