import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseDollars, printCents } from '@/shared/units/money'

describe('money as typed and as shown', () => {
  it.each([
    [5340, '$53.40'],
    [0, '$0.00'],
    [5, '$0.05'],
    [120_000, '$1,200.00'],
    [-534, '-$5.34'],
  ])('prints %d cents', (cents, shown) => expect(printCents(cents)).toBe(shown))

  it.each([
    ['1,200', 120_000],
    ['$3.50', 350],
    ['$ 3.5', 350],
    ['.75', 75],
    ['0', 0],
  ])('reads %s', (typed, cents) => expect(parseDollars(typed)).toBe(cents))

  it.each(['', '$', '.', '-3', '3.555', '1,20', 'three', '1e3', '99999999999', '3 dollars'])(
    'does not read %j',
    (typed) => expect(parseDollars(typed)).toBeNull(),
  )

  it('reads back every amount it prints', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 1_000_000_000 }), (cents) => {
        expect(parseDollars(printCents(cents))).toBe(cents)
      }),
    )
  })
})
