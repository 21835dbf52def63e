import { describe, expect, it } from 'vitest'

import { promisedAtOf, shipSlot } from '@/server/shipping/ship-slot'
import { EVENING_MS } from '@/server/weather/weather-store'
import { dateAfter } from '@/shared/domain/calendar/day-number'

const zones = [
  'America/Phoenix',
  'America/Indiana/Indianapolis',
  'America/New_York',
  'America/Chicago',
  'America/Denver',
  'America/Boise',
  'America/Los_Angeles',
]
const LAST = '2030-12-31'
/** Mondays of five years. */
const mondays = Array.from({ length: 260 }, (_, week) => dateAfter('2026-01-05', 7 * week)).filter(
  (day) => day <= LAST,
)

function wallOf(zone: string) {
  const print = new Intl.DateTimeFormat('sv-SE', { timeZone: zone, dateStyle: 'short', timeStyle: 'short' })
  return (at: Date) => print.format(at)
}

describe('the hours of a box, on every ship day until 2030', () => {
  it.each(zones)('in %s', (zone) => {
    const wall = wallOf(zone)
    for (const monday of mondays) {
      for (const shipDay of [0, 1, 2].map((gone) => dateAfter(monday, gone))) {
        const { slotStartsAt, slotEndsAt } = shipSlot(shipDay, zone)
        expect([wall(slotStartsAt), wall(slotEndsAt)]).toEqual([`${shipDay} 06:00`, `${shipDay} 18:00`])
        const evening = new Date(slotStartsAt.getTime() - EVENING_MS)
        expect(wall(evening)).toBe(`${dateAfter(shipDay, -1)} 16:00`)
        const arriveDay = dateAfter(shipDay, 2)
        expect(wall(promisedAtOf(arriveDay, zone))).toBe(`${arriveDay} 20:00`)
      }
    }
    expect(mondays.length).toBe(260)
  })
})
