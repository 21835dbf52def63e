import { describe, expect, it } from 'vitest'

import { findCrop } from '@/shared/domain/produce/find-crop'
import { sellBy } from '@/shared/domain/produce/sell-by'

function days(
  cropId: string,
  heldC: number,
  form: 'whole' | 'harvest-cut' | 'cut-mixed-or-washed' = 'whole',
) {
  const crop = findCrop(cropId)
  if (!crop) throw new Error(`no crop ${cropId}`)
  return sellBy({ crop, form, harvestDay: '2027-04-12', heldC })
}

describe('the last day of sale', () => {
  it('is the harvest plus the short end of what is published', () => {
    expect(days('leaf_lettuce', 1)).toEqual({ day: '2027-04-19', days: 7, sourceKey: 'ne-veg-guide' })
    expect(days('romaine_lettuce', 0)?.days).toBe(7)
    expect(days('mint', 4)).toEqual({ day: '2027-04-26', days: 14, sourceKey: 'ucd-produce-facts' })
  })

  it('halves it in a good fridge and says that this is our own rule', () => {
    expect(days('leaf_lettuce', 4)).toEqual({ day: '2027-04-15', days: 3, sourceKey: 'house-rule' })
  })

  it('knows that basil dies of cold', () => {
    expect([days('basil', 5)?.days, days('basil', 9)?.days, days('basil', 12)?.days]).toEqual([3, 4, 7])
    expect(days('basil', 1)).toBeNull()
  })

  it('crosses a month and a leap day', () => {
    const crop = findCrop('leaf_lettuce')
    if (!crop) throw new Error('no lettuce')
    expect(sellBy({ crop, form: 'whole', harvestDay: '2028-02-26', heldC: 1 })?.day).toBe('2028-03-04')
  })

  it('is not known at room temperature, once cut, or for what nobody measured', () => {
    expect(days('leaf_lettuce', 21)).toBeNull()
    expect(days('kale', 0, 'cut-mixed-or-washed')).toBeNull()
    expect(days('water_spinach', 5)).toBeNull()
    expect(days('kale', 0, 'harvest-cut')?.days).toBe(7)
  })
})
