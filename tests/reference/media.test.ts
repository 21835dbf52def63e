import { describe, expect, it } from 'vitest'

import { mediaMaterials } from '@/shared/domain/media/media.facts'
import { sources } from '@/shared/sources'

import { errorOf } from './checks/check'
import { mediaChecks } from './checks/media-checks'

describe('weights of media against published ones', () => {
  it.each(mediaChecks)('$what ($from)', (check) => {
    expect(errorOf(check)).toBeLessThanOrEqual(check.within)
  })

  // 4 of the worked example, 2 of the maker, 16 bags, 14 cubic feet.
  it('drops none of them', () => expect(mediaChecks).toHaveLength(36))

  it('finds a figure that is wrong: the bag of gravel read as pounds', () => {
    const gravel = mediaChecks.find((check) => check.what === '50 L of gravel, kg')
    if (!gravel) throw new Error('no check of gravel')
    expect(errorOf({ ...gravel, published: 176.4 })).toBeGreaterThan(gravel.within)
  })

  it('gives every material its source', () => {
    for (const { id, sourceKeys } of mediaMaterials) {
      expect(sourceKeys.length, id).toBeGreaterThan(0)
      expect(sourceKeys.filter((key) => !Object.hasOwn(sources, key))).toEqual([])
    }
  })
})
