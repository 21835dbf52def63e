import { isoWeekOf } from '@/shared/domain/season/iso-week'

const WEEK_MS = 7 * 86_400_000
const LAST_WEEK = 52

/** The first Monday from `thisMonday` on that begins that ISO week; as in the season table, 53 counts as 52. */
export function comingMonday(thisMonday: string, week: number): string {
  const from = Date.parse(`${thisMonday}T12:00:00Z`)
  for (let ahead = 0; ahead <= LAST_WEEK; ahead++) {
    const monday = new Date(from + ahead * WEEK_MS).toISOString().slice(0, 10)
    if (Math.min(isoWeekOf(monday) ?? 0, LAST_WEEK) === Math.min(week, LAST_WEEK)) return monday
  }
  throw new RangeError(`${week} is no ISO week`)
}
