import { describe, expect, it } from 'vitest'

import { crops } from '@/shared/domain/produce/crops.facts'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { methodFault, methodsInWords } from '@/shared/domain/produce/judge-method'

const fault = (cropId: string, unit: { kind: string; netG?: number }) => {
  const crop = findCrop(cropId)
  if (!crop) throw new Error(`no crop ${cropId}`)
  return methodFault(crop, unit)
}

describe('the method of sale', () => {
  it('asks for net weight or bunch when kale is sold per bag', () =>
    expect(fault('kale', { kind: 'bag' })).toBe(
      'A bag does not say how much is in it. Kale: sell by the bunch with its net weight or by net weight.',
    ))

  it('wants the weight of a bunch only where the chart knows the crop by weight', () => {
    expect(fault('kale', { kind: 'bunch' })).toContain('least net weight of one bunch')
    expect(fault('kale', { kind: 'bunch', netG: 170 })).toBeNull()
    expect(fault('spinach', { kind: 'bunch' })).toBeNull()
    expect(fault('basil', { kind: 'bunch' })).toBeNull()
  })

  it.each([
    ['leaf_lettuce', 'head', true],
    ['leaf_lettuce', 'weight', true],
    ['leaf_lettuce', 'dry-pint', false],
    ['strawberry', 'dry-pint', true],
    ['strawberry', 'each', false],
    ['tomato', 'dry-pint', true],
    ['tomato', 'each', true],
    ['microgreens', 'bunch', false],
    ['cucumber', 'head', false],
  ])('%s by %s: %s', (cropId, kind, isFine) =>
    expect(fault(cropId, { kind, netG: 100 }) === null).toBe(isFine),
  )

  it('has words for every crop', () => {
    for (const crop of crops) expect(methodsInWords(crop), crop.id).toMatch(/^by /)
  })
})
