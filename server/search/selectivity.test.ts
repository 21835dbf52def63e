import { describe, expect, it } from 'vitest'

import { Selectivity } from '@/server/search/selectivity'
import type { SearchQuery } from '@/server/search/search-query'

const query: SearchQuery = {
  origin: { lat: 39, lng: -84 },
  radiusKm: 80,
  sort: 'nearest',
  limit: 24,
  mostCents: 90,
}

describe('what share of listings meets the wishes', () => {
  it('is all of them when nothing is wished', () => {
    const { mostCents: _most, ...bare } = query
    expect(new Selectivity().estimate(bare)).toBe(1)
  })

  it('is learnt from what was found, and only for the same wishes', () => {
    const learnt = new Selectivity()
    const before = learnt.estimate({ ...query, count: 20 })
    for (let served = 0; served < 80; served++) learnt.learn(query, 1000, 50)
    expect(learnt.estimate(query)).toBeCloseTo(0.05, 2)
    expect(learnt.estimate({ ...query, count: 20 })).toBe(before)
  })

  it('is not spoilt by one odd search', () => {
    const learnt = new Selectivity()
    learnt.learn(query, 1000, 0)
    expect(learnt.estimate(query)).toBeGreaterThan(0.25)
  })
})
