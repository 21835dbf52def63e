import { describe, expect, it } from 'vitest'

import { comingMonday } from '@/shared/times/coming-monday'
import { mondayOf } from '@/shared/times/monday-of'

describe('the Mondays ahead', () => {
  it.each([
    ['2027-01-11', '2027-01-11'],
    ['2027-01-17', '2027-01-11'],
    ['2027-01-01', '2026-12-28'],
  ])('of the week of %s it is %s', (day, monday) => expect(mondayOf(day)).toBe(monday))

  it.each([
    [2, '2027-01-11'],
    [3, '2027-01-18'],
    [1, '2028-01-03'],
    [52, '2027-12-27'],
    [53, '2027-12-27'],
  ])('week %i begins, from 11 January 2027 on, on %s', (week, monday) =>
    expect(comingMonday('2027-01-11', week)).toBe(monday),
  )

  it('takes both last weeks of a year of 53 for the 52nd', () => {
    expect(comingMonday('2026-12-28', 53)).toBe('2026-12-28')
    expect(comingMonday('2026-12-28', 52)).toBe('2026-12-28')
    expect(comingMonday('2026-12-21', 53)).toBe('2026-12-21')
  })

  it('knows no week 0', () => expect(() => comingMonday('2027-01-11', 0)).toThrow(RangeError))
})
