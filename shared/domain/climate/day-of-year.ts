/** Days of a common year's months: the climate knows no 29 February (it takes the 28th). */
export const monthDays: readonly number[] = [31, 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31]

/** '2027-01-15' → 0 for 1 January … 364 for 31 December. null: not a date of the calendar. */
export function dayOfYear(date: string): number | null {
  const parts = /^(\d{4})-(\d{2})-(\d{2})$/.exec(date)
  const [year, month, day] = (parts ?? []).slice(1).map(Number)
  if (year === undefined || month === undefined || day === undefined) return null
  const length = monthDays[month - 1]
  if (length === undefined || day < 1) return null
  const isLeap = year % 4 === 0 && (year % 100 !== 0 || year % 400 === 0)
  if (day > length + (month === 2 && isLeap ? 1 : 0)) return null
  return monthDays.slice(0, month - 1).reduce((sum, days) => sum + days, 0) + Math.min(day, length) - 1
}
