import { assert, integer, property } from 'fast-check'
import { describe, expect, it } from 'vitest'

import { roundHalfUp } from '@/shared/domain/money/round-half-up'
import { comparableCents } from '@/shared/domain/pricing/comparable-price'
import { gramsPerOunce, gramsPerPound } from '@/shared/units/mass'

const weight = (netG: number) => ({ kind: 'weight', netG }) as const

describe('comparable price', () => {
  it('is exact for any whole ounces and any price, ties half up', () => {
    assert(
      property(integer({ min: 1, max: 100_000 }), integer({ min: 1, max: 1600 }), (cents, ounces) => {
        const unit = weight(ounces * gramsPerOunce)
        expect(comparableCents(cents, unit, 'oz')).toBe(roundHalfUp(cents, ounces))
        expect(comparableCents(cents, unit, 'lb')).toBe(roundHalfUp(cents * 16, ounces))
      }),
      { numRuns: 2000 },
    )
  })

  it('is exact for whole grams too', () => {
    assert(
      property(integer({ min: 1, max: 100_000 }), integer({ min: 1, max: 50_000 }), (cents, grams) => {
        expect(comparableCents(cents, weight(grams), 'kg')).toBe(roundHalfUp(cents * 1000, grams))
        expect(comparableCents(cents, weight(grams), '100g')).toBe(roundHalfUp(cents * 100, grams))
      }),
      { numRuns: 2000 },
    )
  })

  it('rounds half a cent up, where dividing decimal numbers goes wrong', () => {
    expect(comparableCents(5, weight(2 * gramsPerOunce), 'oz')).toBe(3)
    expect(comparableCents(10_05, weight(10 * gramsPerPound), 'lb')).toBe(101)
  })

  it('compares worms by the hundred and media by volume or weight', () => {
    expect(comparableCents(3500, { kind: 'pack', count: 1000 }, '100')).toBe(350)
    const bag = { kind: 'volume', litres: 50, weightKg: 14 } as const
    expect(comparableCents(4000, bag, '10L')).toBe(800)
    expect(comparableCents(4000, bag, 'cu-ft')).toBe(2265)
    expect(comparableCents(4200, bag, 'kg')).toBe(300)
  })

  it('is not known for what holds no measured amount', () => {
    expect(comparableCents(300, { kind: 'head' }, 'lb')).toBeNull()
    expect(comparableCents(300, { kind: 'bunch' }, 'lb')).toBeNull()
    expect(comparableCents(300, { kind: 'dry-pint' }, 'oz')).toBeNull()
    expect(comparableCents(300, weight(500), '10L')).toBeNull()
    expect(comparableCents(300, weight(500), '100')).toBeNull()
  })
})
