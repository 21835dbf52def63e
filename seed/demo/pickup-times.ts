import { DAY_MS } from '@/seed/demo/timeline'
import { dayOf } from '@/server/listings/day-of'
import { instantOf } from '@/server/listings/instant-of'
import type { TypedWindow } from '@/shared/contracts/fish-batch'

/** A pickup window as it is typed, and when it begins and ends. */
export interface Slot extends TypedWindow {
  startsAt: Date
  endsAt: Date
}

/** A habit of the farm: which weekdays (0 is Sunday), from when until when. */
export interface Rhythm {
  weekdays: readonly number[]
  from: string
  until: string
  capacity: number
}

const daysOf: readonly (readonly [from: string, until: string])[] = [
  ['07:30', '08:30'],
  ['12:00', '13:00'],
  ['17:30', '18:30'],
]

export function dayPlus(day: string, days: number): string {
  return new Date(Date.parse(`${day}T12:00:00Z`) + days * DAY_MS).toISOString().slice(0, 10)
}

export function slotOn(typed: TypedWindow, zone: string): Slot {
  const [from, until] = [instantOf(typed.day, typed.from, zone), instantOf(typed.day, typed.until, zone)]
  if (from.kind !== 'once' || until.kind !== 'once')
    throw new Error(`no such time: ${typed.day} ${typed.from}`)
  return { ...typed, startsAt: from.at, endsAt: until.at }
}

/** All windows of a rhythm between two moments. */
export function slotsOf(rhythm: Rhythm, span: { after: Date; until: Date }, zone: string): Slot[] {
  const found: Slot[] = []
  const last = dayOf(span.until, zone)
  for (let day = dayOf(span.after, zone); day <= last; day = dayPlus(day, 1)) {
    if (!rhythm.weekdays.includes(new Date(`${day}T12:00:00Z`).getUTCDay())) continue
    const { from, until, capacity } = rhythm
    const slot = slotOn({ day, from, until, capacity }, zone)
    if (slot.startsAt > span.after && slot.startsAt < span.until) found.push(slot)
  }
  return found
}

/** The daytime slots around a moment, the soonest first. */
function around(at: Date, zone: string): Slot[] {
  const today = dayOf(at, zone)
  return [-2, -1, 0, 1, 2].flatMap((shift) =>
    daysOf.map(([from, until]) => slotOn({ day: dayPlus(today, shift), from, until, capacity: 4 }, zone)),
  )
}

/** The last daytime slot that began before `at`, and the first that begins after it. */
export const slotBefore = (at: Date, zone: string): Slot | undefined =>
  around(at, zone).findLast((slot) => slot.startsAt < at)
export const slotAfter = (at: Date, zone: string): Slot | undefined =>
  around(at, zone).find((slot) => slot.startsAt > at)
