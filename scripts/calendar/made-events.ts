import * as fc from 'fast-check'

import { goodEvent } from './good-file'

import type { CalendarEvent } from '@/shared/calendar/write-calendar'

const MINUTE_MS = 60_000

// The hours of 2024 to 2030 in which clocks of the United States change, in UTC: second Sunday of March, first Sunday of
// November (Energy Policy Act of 2005, sec. 110), 02:00 in zones four to ten hours behind.
function sunday(year: number, month: number, nth: number): number {
  const first = new Date(Date.UTC(year, month, 1)).getUTCDay()
  return Date.UTC(year, month, 1 + ((7 - first) % 7) + 7 * (nth - 1))
}
const edges = [2024, 2025, 2026, 2027, 2028, 2029, 2030].flatMap((year) =>
  [sunday(year, 2, 2), sunday(year, 10, 1)].flatMap((day) =>
    [5, 6, 7, 8, 9, 10, 11, 12].map((hour) => day + hour * 60 * MINUTE_MS),
  ),
)

const start = fc.oneof(
  fc
    .tuple(fc.constantFrom(...edges), fc.integer({ min: -90, max: 90 }))
    .map(([at, off]) => at + off * MINUTE_MS),
  fc
    .integer({ min: Date.UTC(2024, 0, 1) / MINUTE_MS, max: Date.UTC(2030, 11, 31) / MINUTE_MS })
    .map((at) => at * MINUTE_MS),
)

const awkward = fc.constantFrom(
  ',',
  ';',
  '\\',
  '\n',
  '\r\n',
  '\r',
  '"',
  ':',
  '\\n',
  '🐟',
  '👩🏽‍🌾',
  'é',
  '鱼',
  'ß',
  '\u2028',
  '\u0007',
  '\t',
  'BEGIN:VEVENT',
)
const words = fc.oneof(
  fc.string({ unit: 'grapheme', maxLength: 60 }),
  fc.string({ unit: 'binary', maxLength: 60 }),
  fc.array(fc.oneof(awkward, fc.string({ maxLength: 12 })), { maxLength: 40 }).map((parts) => parts.join('')),
  fc.string({ unit: fc.constantFrom('a', 'é', '🐟', ','), minLength: 70, maxLength: 300 }),
)

/** Pickups such as people could make, and worse: emoji, marks that need escapes, long names, hours that come twice. */
export const madeEvents: fc.Arbitrary<CalendarEvent> = fc
  .record({
    start,
    minutes: fc.integer({ min: 1, max: 600 }),
    sequence: fc.nat(50),
    isCancelled: fc.boolean(),
    summary: words,
    description: words,
    location: fc.option(words, { nil: undefined }),
  })
  .map(({ start: at, minutes, location, ...rest }) => ({
    ...goodEvent,
    ...rest,
    startsAt: new Date(at),
    endsAt: new Date(at + minutes * MINUTE_MS),
    location,
  }))

/** How an order's pickup time may go: agreed, moved some times, perhaps off. Minutes from a first moment on. */
export const madeLives = fc.record({
  starts: fc.uniqueArray(start, { minLength: 1, maxLength: 8 }),
  isCancelled: fc.boolean(),
})
