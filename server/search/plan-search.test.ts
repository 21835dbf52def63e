import { describe, expect, it } from 'vitest'

import { hilbertOfPoint } from '@/shared/domain/geo/hilbert'
import { DensityHistogram, FINEST_LEVEL } from '@/server/search/density-histogram'
import { Ladder } from '@/server/search/ladder'
import type { Overview } from '@/server/search/overview-store'
import { planSearch } from '@/server/search/plan-search'
import type { SearchQuery } from '@/server/search/search-query'
import { UNRATED_RANK } from '@/server/search/search-row'

const centre = { lat: 39.125, lng: -84.525 }
const cellOf = (lat: number, lng: number) =>
  Math.floor(hilbertOfPoint({ lat, lng }) / 4 ** (16 - FINEST_LEVEL))

/** So many listings in every square of the histogram, from Texas to Michigan. */
function country(perSquare: number): Overview {
  const cells = []
  const side = 2 ** FINEST_LEVEL
  for (let lat = 30; lat < 46; lat += 180 / side) {
    for (let lng = -100; lng < -75; lng += 360 / side) {
      cells.push({ categoryCode: 1, speciesCode: 3, cell: cellOf(lat, lng), count: perSquare })
    }
  }
  const all = cells.length * perSquare
  const rungs = (least: number, most: number) =>
    Array.from({ length: most - least + 1 }, (_, at) => ({
      categoryCode: 1,
      rung: least + at,
      count: all / (most - least + 1),
    }))
  return {
    density: new DensityHistogram(cells),
    days: new Ladder(rungs(2526, 2555)),
    ranks: new Ladder([...rungs(0, 200), { categoryCode: 1, rung: UNRATED_RANK, count: all }]),
  }
}

const query: SearchQuery = { origin: centre, radiusKm: 200, categoryCode: 1, sort: 'nearest', limit: 24 }

describe('planning a search', () => {
  it('reads a thin circle at once', () => {
    expect(planSearch(query, { overview: country(0.3), selectivity: 1 })).toEqual({ kind: 'circle' })
  })

  it('starts small where listings stand close', () => {
    const plan = planSearch(query, { overview: country(100), selectivity: 1 })
    expect(plan.kind).toBe('grow')
    expect(plan.kind === 'grow' && plan.firstKm).toBeLessThan(40)
  })

  it('starts wider when few listings meet the wishes', () => {
    const of = (selectivity: number) => {
      const plan = planSearch(query, { overview: country(100), selectivity })
      return plan.kind === 'grow' ? plan.firstKm : NaN
    }
    expect(of(0.1)).toBeGreaterThan(of(1) * 1.5)
  })

  it('walks up the prices when the circle is large, also for a species', () => {
    const wide = { ...query, sort: 'cheapest' as const, radiusKm: 1000 }
    expect(planSearch(wide, { overview: country(20), selectivity: 1 })).toEqual({
      kind: 'price-walk',
      categories: [1],
    })
    const { categoryCode: _category, ...named } = { ...wide, speciesCode: 3 }
    expect(planSearch(named, { overview: country(20), selectivity: 1 })).toEqual({
      kind: 'price-walk',
      categories: [1],
    })
  })

  it('does not walk for more than an everyday order: the index knows no such price', () => {
    const wide = { ...query, sort: 'cheapest' as const, radiusKm: 1000 }
    expect(planSearch({ ...wide, count: 99 }, { overview: country(20), selectivity: 1 }).kind).toBe(
      'price-walk',
    )
    expect(planSearch({ ...wide, count: 100 }, { overview: country(20), selectivity: 1 }).kind).toBe('circle')
  })

  it('climbs from the best rated when the circle is large, and no higher than a page needs', () => {
    const plan = planSearch(
      { ...query, sort: 'best-rated', radiusKm: 1000 },
      { overview: country(20), selectivity: 1 },
    )
    expect(plan).toMatchObject({ kind: 'rank-walk', categories: [1] })
    expect(plan.kind === 'rank-walk' && plan.firstRung).toBeLessThan(3)
  })

  it('reads the circle for soonest when the first day asked is late: most listings stand below it', () => {
    const soonest = { ...query, sort: 'soonest' as const, radiusKm: 200 }
    const from = (day: number) =>
      planSearch(
        { ...soonest, days: { from: day, until: day + 13 } },
        { overview: country(20), selectivity: 1 },
      ).kind
    expect(from(2526)).toBe('rank-walk')
    expect(from(2550)).toBe('circle')
  })

  it('reads the circle of a species nobody has counted yet', () => {
    const { categoryCode: _category, ...rest } = query
    const unknown = { ...rest, speciesCode: 9, sort: 'cheapest' as const, radiusKm: 4000 }
    expect(planSearch(unknown, { overview: country(20), selectivity: 1 })).toEqual({ kind: 'circle' })
  })
})
