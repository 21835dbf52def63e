import { describe, expect, it } from 'vitest'

import { judgeParcel } from '@/shared/domain/produce/chilling-companions'
import type { Crop } from '@/shared/domain/produce/crop'
import { findCrop } from '@/shared/domain/produce/find-crop'

const crops = (...ids: string[]) =>
  ids.map((id) => findCrop(id)).filter((crop): crop is Crop => crop !== null)

describe('crops in one parcel', () => {
  it('refuses basil with lettuce, in either order, and says to pack two', () => {
    const judged = judgeParcel(crops('basil', 'leaf_lettuce'), false)
    expect(judged).toEqual({
      verdict: 'refuse',
      saying: 'Basil: harmed below 54 °F (12 °C); Leaf lettuce: kept colder. Pack them in two parcels.',
    })
    expect(judgeParcel(crops('leaf_lettuce', 'basil'), false).verdict).toBe('refuse')
    expect(judgeParcel(crops('mint', 'cucumber'), false).verdict).toBe('refuse')
  })

  it('refuses ice on what the cold harms', () => {
    expect(judgeParcel(crops('basil'), true).verdict).toBe('refuse')
    expect(judgeParcel(crops('basil'), false).verdict).toBe('together')
  })

  it('lets greens travel together, on ice too', () => {
    expect(judgeParcel(crops('kale', 'leaf_lettuce', 'mint'), true).verdict).toBe('together')
    expect(judgeParcel([], true).verdict).toBe('together')
  })

  it('finds the one that is harmed even when another tender one bears the rest', () =>
    expect(judgeParcel(crops('pepper', 'basil', 'cucumber'), false).verdict).toBe('refuse'))
})
