import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { dayMask, dayNumber, dayText, packOpenDays } from '@/server/search/open-days'

describe('the days on which a listing can be had', () => {
  it('are counted from 2020-01-01', () => {
    expect(dayNumber('2020-01-01')).toBe(0)
    expect(dayNumber('2027-01-15')).toBe(2571)
    expect(dayText(2571)).toBe('2027-01-15')
    // Both sides of the change to summer time.
    expect(dayNumber('2027-03-15') - dayNumber('2027-03-13')).toBe(2)
  })

  it('are none when there are none', () => expect(packOpenDays([])).toBeNull())

  it('reach 63 days from the first on, and end on an open day', () => {
    expect(packOpenDays([100, 110, 163, 164, 300])).toMatchObject({ nextDay: 100, lastDay: 163 })
  })

  it('meet a range exactly when one of them lies in it', () => {
    const someDays = fc.uniqueArray(fc.integer({ min: 2500, max: 2600 }), { minLength: 1, maxLength: 12 })
    fc.assert(
      fc.property(someDays, fc.integer({ min: 2400, max: 2700 }), fc.nat(120), (days, from, length) => {
        const until = from + length
        const packed = packOpenDays(days)
        if (!packed) throw new Error('expected days')
        const mask = dayMask({ from, until })
        const meets =
          packed.lastDay >= from &&
          packed.nextDay <= until &&
          (mask === null || (packed.openDays & mask) !== 0n)
        const held = days.filter((day) => day < packed.nextDay + 64)
        expect(meets).toBe(held.some((day) => day >= from && day <= until))
      }),
      { numRuns: 2000 },
    )
  })
})
