import { describe, expect, it } from 'vitest'

import { findCrop } from '@/shared/domain/produce/find-crop'
import { unitPrice } from '@/shared/domain/produce/unit-price'
import type { SaleUnit } from '@/shared/domain/listings/sale-unit'
import type { UnitSystem } from '@/shared/units/unit-system'
import { gramsPerOunce } from '@/shared/units/mass'

const priceIn = (units: UnitSystem) => (cropId: string, unit: SaleUnit, unitCents: number) => {
  const crop = findCrop(cropId)
  if (!crop) throw new Error(`no crop ${cropId}`)
  return unitPrice({ crop, unit, unitCents }, units)
}
const priceOf = priceIn('us')

describe('the price of produce', () => {
  it('stands by the pound beside a bunch of kale that says its weight', () => {
    const shown = priceOf('kale', { kind: 'bunch', netG: 6 * gramsPerOunce }, 350)
    expect([shown.price, shown.comparable]).toEqual(['$3.50 a bunch', '$9.33/lb'])
    expect(shown.netWeight).toBe('Net weight 6 oz (170 g), without box or root ball.')
  })

  it('stands by the ounce for microgreens and herbs', () => {
    const shown = priceOf('microgreens', { kind: 'weight', netG: 2 * gramsPerOunce }, 600)
    expect([shown.price, shown.comparable]).toEqual(['$6.00 for 2 oz (57 g)', '$3.00/oz'])
    expect(priceIn('metric')('basil', { kind: 'weight', netG: 100 }, 400).comparable).toBe('$4.00/100 g')
  })

  it('is by kilogram for metric readers', () =>
    expect(priceIn('metric')('tomato', { kind: 'weight', netG: 500 }, 250).comparable).toBe('$5.00/kg'))

  it('invents no weight for heads, pieces, pints and bare bunches', () => {
    const heads = priceOf('leaf_lettuce', { kind: 'head' }, 300)
    expect(heads).toEqual({
      price: '$3.00 a head',
      comparable: null,
      comparableCents: null,
      basis: null,
      netWeight: null,
    })
    expect(priceOf('tomato', { kind: 'dry-pint' }, 400).price).toBe('$4.00 a dry pint')
    expect(priceOf('cucumber', { kind: 'each' }, 100).price).toBe('$1.00 each')
    expect(priceOf('basil', { kind: 'bunch' }, 300).comparable).toBeNull()
  })
})
