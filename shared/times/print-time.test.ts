import { describe, expect, it } from 'vitest'

import { printMoment, printSlot } from '@/shared/times/print-time'

describe('printing the time of a place', () => {
  it('gives a window with its day and the zone of the place', () => {
    const slot = {
      startsAt: '2027-01-16T14:00:00Z',
      endsAt: '2027-01-16T15:00:00Z',
      zone: 'America/New_York',
    }
    expect(printSlot(slot)).toBe('Sat, Jan 16, 9:00 AM to 10:00 AM EST')
  })

  it('names the time of both ends when the clocks change in between', () => {
    const autumn = { startsAt: '2027-11-07T04:30:00Z', endsAt: '2027-11-07T07:30:00Z' }
    expect(printSlot({ ...autumn, zone: 'America/New_York' })).toBe('Sun, Nov 7, 12:30 AM EDT to 2:30 AM EST')
    expect(printSlot({ ...autumn, zone: 'America/Phoenix' })).toBe('Sat, Nov 6, 9:30 PM to 12:30 AM MST')
  })

  it('names the two hours of an autumn night apart', () => {
    expect(printMoment('2027-11-07T05:30:00Z', 'America/New_York')).toBe('Sun, Nov 7, 1:30 AM EDT')
    expect(printMoment('2027-11-07T06:30:00Z', 'America/New_York')).toBe('Sun, Nov 7, 1:30 AM EST')
  })

  it('keeps Indiana and Arizona in their own time', () => {
    expect(printMoment('2027-07-01T16:00:00Z', 'America/Indiana/Indianapolis')).toContain('12:00 PM EDT')
    expect(printMoment('2027-07-01T16:00:00Z', 'America/Phoenix')).toContain('9:00 AM MST')
  })
})
