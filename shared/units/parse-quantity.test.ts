import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { parseQuantity } from '@/shared/units/parse-quantity'

describe('reading a typed quantity', () => {
  it.each([
    ['2 1/4 in', 2.25, 'in'],
    ['2-1/4 in', 2.25, 'in'],
    ['2¼ in', 2.25, 'in'],
    ['½lb', 0.5, 'lb'],
    ['1,200 fish', 1200, 'fish'],
    ['75gal', 75, 'gal'],
    ['.5 oz.', 0.5, 'oz'],
    ['2 Cu.  Ft.', 2, 'cu ft'],
    ['20', 20, ''],
  ])('reads %s', (typed, value, unit) => expect(parseQuantity(typed)).toEqual({ value, unit }))

  it.each(['', 'fish', '-3 in', '1,20', '1/0 in', '3-4in', '1.2.3', 'NaN', 'Infinity'])(
    'does not read %j',
    (typed) => expect(parseQuantity(typed)).toBeNull(),
  )

  it('never answers NaN or a negative, whatever is typed', () => {
    fc.assert(
      fc.property(
        fc.string({ unit: fc.constantFrom(...'0123456789.,/ -¼½e∞inlb'), maxLength: 12 }),
        (typed) => {
          const quantity = parseQuantity(typed)
          expect(quantity === null || (Number.isFinite(quantity.value) && quantity.value >= 0)).toBe(true)
        },
      ),
    )
  })
})
