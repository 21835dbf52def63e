import { dayOfYear } from '@/shared/domain/climate/day-of-year'

const monthStarts: readonly number[] = [0, 31, 59, 90, 120, 151, 181, 212, 243, 273, 304, 334]

const isLeapYear = (year: number) => year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0)

const daysBeforeYear = (year: number) =>
  (year - 1) * 365 + Math.floor((year - 1) / 4) - Math.floor((year - 1) / 100) + Math.floor((year - 1) / 400)

/** Whole days from 1 January of year 1 (a Monday) to a date 'YYYY-MM-DD'. null: not a date of the calendar. */
export function dayNumberOf(date: string): number | null {
  if (dayOfYear(date) === null) return null
  const [year = NaN, month = NaN, day = NaN] = date.split('-').map(Number)
  const leapDay = isLeapYear(year) && month > 2 ? 1 : 0
  return daysBeforeYear(year) + (monthStarts[month - 1] ?? NaN) + leapDay + day - 1
}

/** 0 Monday … 6 Sunday. */
export const weekdayOfNumber = (dayNumber: number) => dayNumber % 7

/** The way back: 'YYYY-MM-DD' for the years 1 to 9999. */
export function dateOfNumber(dayNumber: number): string {
  // 400 years of the calendar are 146,097 days: the guess is at most a year off.
  let year = Math.floor((dayNumber * 400) / 146_097) + 1
  if (daysBeforeYear(year) > dayNumber) year -= 1
  if (daysBeforeYear(year + 1) <= dayNumber) year += 1
  const inYear = dayNumber - daysBeforeYear(year)
  const startOf = (month: number) => (monthStarts[month] ?? NaN) + (isLeapYear(year) && month > 1 ? 1 : 0)
  let month = 11
  while (startOf(month) > inYear) month -= 1
  const two = (part: number) => String(part).padStart(2, '0')
  return `${String(year).padStart(4, '0')}-${two(month + 1)}-${two(inYear - startOf(month) + 1)}`
}

/** The date some days later (or, negative, earlier). Throws RangeError for what is no date. */
export function dateAfter(date: string, days: number): string {
  const number = dayNumberOf(date)
  if (number === null) throw new RangeError(`${date} is not a date of the calendar`)
  return dateOfNumber(number + days)
}
