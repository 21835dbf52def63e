import { describe, expect, it } from 'vitest'

import { ratingRank } from '@/server/search/rating-rank'

describe('the place of a seller by ratings', () => {
  it('puts a hundred good ratings before one perfect one', () => {
    expect(ratingRank(4.8, 100)).toBeLessThan(ratingRank(5, 1))
  })
  it('puts everybody who is rated before those who are not', () => {
    expect(ratingRank(1, 10_000)).toBeLessThan(ratingRank(0, 0))
  })
  it('is 0 at best and 500 at worst', () => {
    expect(ratingRank(5, 1e9)).toBe(0)
    expect(ratingRank(0, 1e9)).toBe(500)
  })
})
