import { describe, expect, it } from 'vitest'

import type { Crop } from '@/shared/domain/produce/crop'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { adviseSlotHeat } from '@/shared/domain/produce/heat-in-slot'
import { celsiusFromF } from '@/shared/units/temperature'

const crop = (id: string): Crop => {
  const found = findCrop(id)
  if (!found) throw new Error(`no crop ${id}`)
  return found
}
const hot = celsiusFromF(98)

describe('heat in a pickup slot', () => {
  it('at 98 °F advises a cooler, and cautions for greens after 11:00', () => {
    const early = adviseSlotHeat({ warmestC: hot, untilHour: 11, crop: crop('leaf_lettuce') })
    expect([early.verdict, early.caution]).toEqual(['cooler', null])
    expect(early.cooler).toBe(
      '98 °F (36.5 °C) is forecast: bring a cooler with ice and drive straight home. A closed car gets far hotter.',
    )
    const late = adviseSlotHeat({ warmestC: hot, untilHour: 19, crop: crop('leaf_lettuce') })
    expect(late.verdict).toBe('caution')
    expect(late.caution).toContain('11:00')
    expect(late.cooler).toBe(early.cooler)
  })

  it('keeps ice off basil and asks nothing more of tomatoes', () => {
    expect(adviseSlotHeat({ warmestC: hot, untilHour: 18, crop: crop('basil') }).cooler).toContain(
      'without ice',
    )
    expect(adviseSlotHeat({ warmestC: hot, untilHour: 18, crop: crop('tomato') }).verdict).toBe('cooler')
  })

  it('never refuses, says nothing on a mild day, and admits when there is no forecast', () => {
    expect(adviseSlotHeat({ warmestC: 26.9, untilHour: 18, crop: crop('kale') }).verdict).toBe('fine')
    expect(adviseSlotHeat({ warmestC: 27, untilHour: 18, crop: crop('kale') }).verdict).toBe('caution')
    expect(adviseSlotHeat({ warmestC: null, untilHour: 18, crop: crop('kale') })).toEqual({
      verdict: 'unknown',
      cooler: null,
      caution: null,
    })
  })
})
