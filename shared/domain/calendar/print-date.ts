import { dayNumberOf, weekdayOfNumber } from '@/shared/domain/calendar/day-number'

const weekdays = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'] as const
const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const

/** A date 'YYYY-MM-DD' inside a sentence: "Mon, Dec 7". Throws RangeError for what is no date. */
export function printDate(date: string): string {
  const number = dayNumberOf(date)
  if (number === null) throw new RangeError(`${date} is not a date of the calendar`)
  const [, month = 0, day = 0] = date.split('-').map(Number)
  return `${weekdays[weekdayOfNumber(number)]}, ${months[month - 1]} ${day}`
}

/** The same where it may lie years away, as on papers: "Mon, Dec 7, 2026". */
export const printDateOfYear = (date: string) => `${printDate(date)}, ${Number(date.slice(0, 4))}`
