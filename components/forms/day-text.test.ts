import { describe, expect, it } from 'vitest'

import { addDays, nextSaturday, printDay, printTime } from './day-text'

import { zoneWords } from '@/shared/times/zone-words'

describe('days and times of a pickup', () => {
  it('counts days over the end of a month and of a year', () => {
    expect(addDays('2026-12-26', 7)).toBe('2027-01-02')
    expect(addDays('2028-02-28', 1)).toBe('2028-02-29')
    expect(addDays('', 7)).toBe('')
  })

  it('finds the Saturday to come, never the day itself', () => {
    expect(nextSaturday('2027-01-15')).toBe('2027-01-16')
    expect(nextSaturday('2027-01-16')).toBe('2027-01-23')
    expect(nextSaturday('2027-01-17')).toBe('2027-01-23')
  })

  it('prints the day and the time of the place, and names the zone', () => {
    expect(printDay('2027-01-23')).toBe('Sat, Jan 23')
    expect(printTime('09:30')).toBe('9:30 AM')
    expect(printTime('')).toBe('')
    expect(zoneWords('America/New_York')).toBe('Eastern Time')
  })
})
