import { describe, expect, it } from 'vitest'

import { categoryCode, categoryCodes, categoryOfCode } from '@/server/search/category-codes'

describe('category codes', () => {
  it('never change: rows are stored by them', () => {
    expect([
      categoryCode('fish'),
      categoryCode('worms'),
      categoryCode('media'),
      categoryCode('produce'),
    ]).toEqual([1, 2, 3, 4])
    expect(categoryCodes).toEqual([1, 2, 3, 4])
  })
  it('are read back', () => {
    expect(categoryOfCode(2)).toBe('worms')
    expect(categoryOfCode(0)).toBeNull()
  })
})
