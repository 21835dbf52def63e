import { TZDate } from '@date-fns/tz'

import { dayOf } from '@/server/listings/day-of'
import { dayOn, wallInstant } from '@/server/notices/wall-instant'

/** On the wall clock of a zone: "22:00" to "07:00" goes over midnight. */
export interface QuietHours {
  from: string
  until: string
  zone: string
}

function wallTime(at: Date, zone: string): string {
  const local = new TZDate(at.getTime(), zone)
  const two = (part: number) => String(part).padStart(2, '0')
  return `${two(local.getHours())}:${two(local.getMinutes())}`
}

/** When the quiet time that `at` falls into ends; null when it falls into none. */
export function quietUntil(at: Date, quiet: QuietHours): Date | null {
  const { from, until, zone } = quiet
  const time = wallTime(at, zone)
  const isOverMidnight = from > until
  const isQuiet = isOverMidnight ? time >= from || time < until : time >= from && time < until
  if (!isQuiet) return null
  const today = dayOf(at, zone)
  const end = wallInstant(time < until ? today : dayOn(today, 1), until, zone)
  // In the hour that comes twice, its first pass may already lie behind.
  return end > at ? end : null
}
