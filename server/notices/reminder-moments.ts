import { dayOf } from '@/server/listings/day-of'
import { quietUntil, type QuietHours } from '@/server/notices/quiet-until'
import { dayOn, wallInstant } from '@/server/notices/wall-instant'

const HOUR_MS = 3_600_000
/** House rules: when people still plan tomorrow, and how long before a pickup they leave home. */
const EVENING = '18:00'
const SHORTLY_BEFORE_MS = 2 * HOUR_MS
/** A reminder that could not go out is given up after this long: at night it would only wake people. */
const LATEST_MS = 4 * HOUR_MS
/** Quiet hours hold the last reminder back only while at least this long remains until the pickup. */
const LEAST_WARNING_MS = HOUR_MS

export type ReminderKind = 'evening-before' | 'two-hours-before'

export interface Pickup {
  startsAt: Date
  /** The zone of the seller's place. */
  zone: string
  /** When this time was agreed: what was due before that is not made up for. */
  agreedAt: Date
}

/** 18:00 at the seller's place on the day before; and two hours before by the stopwatch, whatever the clocks do. */
export function reminderMoment(kind: ReminderKind, { startsAt, zone }: Pickup): Date {
  return kind === 'evening-before'
    ? wallInstant(dayOn(dayOf(startsAt, zone), -1), EVENING, zone)
    : new Date(startsAt.getTime() - SHORTLY_BEFORE_MS)
}

function afterQuiet(kind: ReminderKind, pickup: Pickup, quiet: QuietHours | null): Date {
  const moment = reminderMoment(kind, pickup)
  const end = quiet ? quietUntil(moment, quiet) : null
  if (!end) return moment
  const isTooLate =
    kind === 'two-hours-before' && pickup.startsAt.getTime() - end.getTime() < LEAST_WARNING_MS
  return isTooLate ? moment : end
}

/** Whether a party with these quiet hours is to be reminded now. */
export function isReminderDue(
  kind: ReminderKind,
  pickup: Pickup,
  given: { at: Date; quiet: QuietHours | null },
): boolean {
  if (pickup.agreedAt > reminderMoment(kind, pickup)) return false
  const from = afterQuiet(kind, pickup, given.quiet)
  const until =
    kind === 'evening-before'
      ? Math.min(from.getTime() + LATEST_MS, reminderMoment('two-hours-before', pickup).getTime())
      : pickup.startsAt.getTime()
  return given.at >= from && given.at.getTime() < until
}
