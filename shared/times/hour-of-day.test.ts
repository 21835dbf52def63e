import { expect, it } from 'vitest'

import { dayInZone } from './day-in-zone'
import { hourOfDay } from './hour-of-day'

it.each([
  ['2027-01-16T14:30:00.000Z', 'America/New_York', 9.5, '2027-01-16'],
  ['2027-01-16T04:15:00.000Z', 'America/Chicago', 22.25, '2027-01-15'],
  ['2027-01-16T05:00:00.000Z', 'America/New_York', 0, '2027-01-16'],
  // The second one o'clock of the night on which clocks are put back.
  ['2027-11-07T06:30:00.000Z', 'America/New_York', 1.5, '2027-11-07'],
])('%s in %s is %d h on %s', (at, zone, ...said) => {
  expect([hourOfDay(at, zone), dayInZone(at, zone)]).toEqual(said)
})
