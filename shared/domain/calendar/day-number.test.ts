import { describe, expect, it } from 'vitest'

import { dateAfter, dateOfNumber, dayNumberOf, weekdayOfNumber } from '@/shared/domain/calendar/day-number'

const DAY_MS = 86_400_000
const asUtc = (date: string) => Date.parse(`${date}T00:00:00Z`)

describe('days counted', () => {
  it('agrees with the platform calendar on every day of 1999 to 2103, there and back', () => {
    const first = dayNumberOf('1999-01-01') ?? NaN
    let at = asUtc('1999-01-01')
    for (let number = first; at < asUtc('2104-01-01'); number++, at += DAY_MS) {
      const date = new Date(at).toISOString().slice(0, 10)
      expect(dayNumberOf(date)).toBe(number)
      expect(dateOfNumber(number)).toBe(date)
      expect(weekdayOfNumber(number)).toBe((new Date(at).getUTCDay() + 6) % 7)
    }
  })

  it('knows the first day and a century that was no leap year', () => {
    expect(dayNumberOf('0001-01-01')).toBe(0)
    expect(dateOfNumber(0)).toBe('0001-01-01')
    expect(dateAfter('1900-02-28', 1)).toBe('1900-03-01')
    expect(dateAfter('2000-02-28', 1)).toBe('2000-02-29')
    expect(dateAfter('2027-01-03', -4)).toBe('2026-12-30')
  })

  it('refuses what is no date', () => {
    expect(dayNumberOf('2027-02-29')).toBeNull()
    expect(dayNumberOf('soon')).toBeNull()
    expect(() => dateAfter('2027-13-01', 1)).toThrow(RangeError)
  })
})
