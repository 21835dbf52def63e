import { describe, expect, it } from 'vitest'

import { crops } from '@/shared/domain/produce/crops.facts'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { keepingTime } from '@/shared/domain/produce/sell-by'

import { errorOf } from './checks/check'
import { produceChecks } from './checks/produce-checks'

describe('produce figures against published ones', () => {
  it.each(produceChecks)('$what ($from)', (check) => {
    expect(errorOf(check)).toBeLessThanOrEqual(check.within)
  })

  // 14 rows of the guide, 13 of Davis, 4 of 1954, 1 of sweet basil, twice each; 12 storage ends; 4 single figures.
  it('drops none of them', () => expect(produceChecks).toHaveLength(80))

  it('finds a figure that is wrong: a lettuce that keeps a day longer', () => {
    const lettuce = produceChecks.find((check) => check.what === 'leaf_lettuce at 32 °F, shortest days')
    if (!lettuce) throw new Error('no check of lettuce')
    expect(errorOf({ ...lettuce, published: 8 })).toBeGreaterThan(lettuce.within)
  })

  it('answers nothing for a crop at a temperature that nobody published', () => {
    for (const crop of crops) expect(keepingTime(crop, 25)).toBeNull()
    const basil = findCrop('basil')
    expect(basil && keepingTime(basil, 1)).toBeNull()
  })

  it('never lets our own half life outlast what is published for the cold', () => {
    for (const { id, keeps } of crops) {
      const [published, ...warmer] = keeps
      for (const row of warmer.filter((one) => one.sourceKey === 'house-rule'))
        expect(row.days[1], id).toBeLessThan(published?.days[1] ?? 0)
    }
  })
})
