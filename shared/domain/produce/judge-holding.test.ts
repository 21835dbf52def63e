import { describe, expect, it } from 'vitest'

import { findCrop } from '@/shared/domain/produce/find-crop'
import { adviseHolding, holdingFault } from '@/shared/domain/produce/judge-holding'

const crop = (id: string) => {
  const found = findCrop(id)
  if (!found) throw new Error(`no crop ${id}`)
  return found
}

describe('how a harvest is held', () => {
  it('keeps cut leafy greens at 41 °F or colder, and only those', () => {
    const cut = { crop: crop('kale'), form: 'cut-mixed-or-washed' } as const
    expect(holdingFault({ ...cut, heldC: 5 })).toBeNull()
    expect(holdingFault({ ...cut, heldC: 5.1 })).toContain('41 °F (5 °C)')
    expect(holdingFault({ ...cut, form: 'harvest-cut', heldC: 20 })).toBeNull()
    expect(holdingFault({ ...cut, crop: crop('basil'), heldC: 20 })).toBeNull()
  })

  it('warns of cold for basil and of fish water on leaves, and blocks neither', () => {
    const held = { form: 'whole', rinsedInDrinkingWater: false } as const
    expect(adviseHolding({ ...held, crop: crop('basil'), heldC: 4, touchesSystemWater: 'no' })).toEqual([
      'Basil: harmed below 54 °F (12 °C). Keep it less cold.',
    ])
    expect(
      adviseHolding({ ...held, crop: crop('kale'), heldC: 1, touchesSystemWater: 'not-sure' })[0],
    ).toContain('rinse the harvest')
    expect(adviseHolding({ ...held, crop: crop('kale'), heldC: 1, touchesSystemWater: 'no' })).toEqual([])
  })
})
