import { TZDate } from '@date-fns/tz'

/** The calendar day of an instant at a place: '2027-01-15'. */
export function dayOf(at: Date, zone: string): string {
  const local = new TZDate(at.getTime(), zone)
  const two = (part: number) => String(part).padStart(2, '0')
  return `${local.getFullYear()}-${two(local.getMonth() + 1)}-${two(local.getDate())}`
}
