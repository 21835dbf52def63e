import { describe, expect, it } from 'vitest'

import { dateAfter } from '@/shared/domain/calendar/day-number'
import { printDate, printDateOfYear } from '@/shared/domain/calendar/print-date'
import { printDay } from '@/shared/times/print-time'

describe('a date inside a sentence', () => {
  it('reads as the rest of the product writes days, on every day of a leap year', () => {
    for (let gone = 0; gone < 366; gone++) {
      const date = dateAfter('2028-01-01', gone)
      expect(printDate(date)).toBe(printDay(`${date}T12:00:00Z`, 'UTC'))
    }
  })

  it('names the year of a paper', () => {
    expect(printDateOfYear('2026-12-07')).toBe('Mon, Dec 7, 2026')
  })

  it.each(['', '2026-02-30', 'tomorrow'])('does not read "%s"', (text) => {
    expect(() => printDate(text)).toThrow(RangeError)
  })
})
