import { describe, expect, it } from 'vitest'

import { dayOf } from '@/server/listings/day-of'
import { instantOf } from '@/server/listings/instant-of'

const iso = (day: string, time: string, zone: string) => {
  const read = instantOf(day, time, zone)
  return read.kind === 'once' ? read.at.toISOString() : read.kind
}

describe('a time on the wall of the farm', () => {
  it.each([
    ['2027-01-23', '09:00', 'America/New_York', '2027-01-23T14:00:00.000Z'],
    ['2027-07-23', '09:00', 'America/New_York', '2027-07-23T13:00:00.000Z'],
    ['2027-07-23', '09:00', 'America/Phoenix', '2027-07-23T16:00:00.000Z'],
    ['2027-07-23', '23:30', 'Pacific/Honolulu', '2027-07-24T09:30:00.000Z'],
    ['2027-07-23', '09:00', 'America/Indiana/Knox', '2027-07-23T14:00:00.000Z'],
  ])('%s %s in %s is %s', (...given) => {
    const [day, time, zone, at] = given
    expect(iso(day, time, zone)).toBe(at)
  })

  it('knows that half past two does not exist when the clocks go forward', () => {
    expect(iso('2027-03-14', '02:30', 'America/New_York')).toBe('never')
    expect(iso('2027-03-14', '01:59', 'America/New_York')).toBe('2027-03-14T06:59:00.000Z')
    expect(iso('2027-03-14', '03:00', 'America/New_York')).toBe('2027-03-14T07:00:00.000Z')
    expect(iso('2027-03-14', '02:30', 'America/Phoenix')).toBe('2027-03-14T09:30:00.000Z')
  })

  it('knows that half past one comes twice when the clocks go back', () => {
    expect(iso('2027-11-07', '01:30', 'America/New_York')).toBe('twice')
    expect(iso('2027-11-07', '02:00', 'America/New_York')).toBe('2027-11-07T07:00:00.000Z')
  })

  it.each([
    ['2027-02-30', '09:00'],
    ['2027-01-10', '25:00'],
    ['soon', '09:00'],
  ])('has no instant for %s %s', (day, time) => expect(iso(day, time, 'America/New_York')).toBe('never'))

  it('finds every hour of every US change of the clocks from 2024 to 2030 once, never or twice', () => {
    for (let year = 2024; year <= 2030; year++) {
      const second = new Date(Date.UTC(year, 2, 8 + ((7 - new Date(Date.UTC(year, 2, 8)).getUTCDay()) % 7)))
      const first = new Date(Date.UTC(year, 10, 1 + ((7 - new Date(Date.UTC(year, 10, 1)).getUTCDay()) % 7)))
      const kinds = (day: Date, zone: string) =>
        [0, 1, 2, 3, 4].map((hour) => instantOf(day.toISOString().slice(0, 10), `0${hour}:30`, zone).kind)
      expect(kinds(second, 'America/Chicago')).toEqual(['once', 'once', 'never', 'once', 'once'])
      expect(kinds(first, 'America/Chicago')).toEqual(['once', 'twice', 'once', 'once', 'once'])
      expect(kinds(second, 'America/Phoenix')).toEqual(['once', 'once', 'once', 'once', 'once'])
      expect(kinds(first, 'Pacific/Honolulu')).toEqual(['once', 'once', 'once', 'once', 'once'])
    }
  })
})

describe('the day at a place', () => {
  it('is the local one', () => {
    expect(dayOf(new Date('2027-01-16T03:00:00Z'), 'America/New_York')).toBe('2027-01-15')
    expect(dayOf(new Date('2027-01-16T03:00:00Z'), 'UTC')).toBe('2027-01-16')
  })
})
