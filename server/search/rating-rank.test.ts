import { describe, expect, it } from 'vitest'

import { ratingRank } from '@/server/search/rating-rank'
import { siteMeanOf } from '@/server/search/site-mean'

const rank = (mean: number, count: number, siteMean = 4) => ratingRank({ mean, count }, siteMean)

describe('the place of a seller by ratings', () => {
  it('puts a hundred good ratings before one perfect one', () => {
    expect(rank(4.8, 100)).toBeLessThan(rank(5, 1))
  })
  it('puts everybody who is rated before those who are not', () => {
    expect(rank(1, 10_000)).toBeLessThan(rank(0, 0))
  })
  it('is 0 at best and 500 at worst', () => {
    expect(rank(5, 1e9)).toBe(0)
    expect(rank(0, 1e9)).toBe(500)
  })
  it('lets the mean of the site weigh five ratings', () => {
    expect(rank(5, 5, 4)).toBe(500 - 450)
    expect(rank(5, 5, 3)).toBe(500 - 400)
  })
  it('takes an ordinary 4.0 until the site has twenty ratings of its own', () => {
    expect(siteMeanOf({ count: 19, mean: 2 })).toBe(4)
    expect(siteMeanOf({ count: 20, mean: 4.66 })).toBe(4.7)
  })
})
