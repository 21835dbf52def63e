import { describe, expect, it } from 'vitest'

import { hilbertOfPoint } from '@/shared/domain/geo/hilbert'
import { DensityHistogram, FINEST_LEVEL } from '@/server/search/density-histogram'
import { Ladder } from '@/server/search/ladder'
import type { Overview } from '@/server/search/overview-store'
import { planSearch } from '@/server/search/plan-search'
import type { SearchQuery } from '@/server/search/search-query'
import { UNRATED_RANK } from '@/server/search/search-row'
import { Selectivity } from '@/server/search/selectivity'

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

const planIn = (overview: Overview, asked: SearchQuery) =>
  planSearch(asked, { overview, selectivity: new Selectivity() })

describe('planning a search', () => {
  it('reads a thin circle at once', () => {
    expect(planIn(country(0.3), query)).toEqual({ kind: 'circle' })
  })

  it('starts small where listings stand close', () => {
    const plan = planIn(country(100), query)
    expect(plan.kind).toBe('grow')
    expect(plan.kind === 'grow' && plan.firstKm).toBeLessThan(40)
  })

  it('starts wider when few listings meet the wishes', () => {
    const firstKm = (wishes: Partial<SearchQuery>) => {
      const plan = planIn(country(100), { ...query, ...wishes })
      return plan.kind === 'grow' ? plan.firstKm : NaN
    }
    expect(firstKm({ count: 50 })).toBeGreaterThan(firstKm({}) * 1.5)
  })

  it('walks up the prices when the circle is large, also for a species', () => {
    const wide = { ...query, sort: 'cheapest' as const, radiusKm: 1000 }
    expect(planIn(country(20), wide)).toEqual({
      kind: 'price-walk',
      categories: [1],
    })
    const { categoryCode: _category, ...named } = { ...wide, speciesCode: 3 }
    expect(planIn(country(20), named)).toEqual({
      kind: 'price-walk',
      categories: [1],
    })
  })

  it('does not walk for more than an everyday order: the index knows no such price', () => {
    const wide = { ...query, sort: 'cheapest' as const, radiusKm: 1000 }
    expect(planIn(country(20), { ...wide, count: 99 }).kind).toBe('price-walk')
    expect(planIn(country(20), { ...wide, count: 100 }).kind).toBe('circle')
  })

  it('climbs from the best rated when the circle is large, and no higher than a page needs', () => {
    const plan = planIn(country(20), { ...query, sort: 'best-rated', radiusKm: 1000 })
    expect(plan).toMatchObject({ kind: 'rank-walk', categories: [1] })
    expect(plan.kind === 'rank-walk' && plan.firstRung).toBeLessThan(3)
  })

  it('reads day by day outwards when one day fills pages', () => {
    const days = { from: 2540, until: 2553 }
    const plan = planIn(country(20), { ...query, sort: 'soonest', days })
    expect(plan).toMatchObject({ kind: 'day-grow', days })
    expect(plan.kind === 'day-grow' && plan.firstKm).toBeLessThan(80)
  })

  it('climbs the days when none was asked', () => {
    expect(planIn(country(20), { ...query, sort: 'soonest', radiusKm: 1000 })).toMatchObject({
      kind: 'rank-walk',
      firstRung: 2526,
    })
  })

  it('reads the circle for soonest when days are thin and most listings could be had before', () => {
    const rare = { ...query, count: 60, mostCents: 90, sizeMm: { from: 40, to: 45 } }
    const days = { from: 2550, until: 2551 }
    expect(planIn(country(1), { ...rare, sort: 'soonest', days })).toEqual({ kind: 'circle' })
  })

  it('reads the circle of a species nobody has counted yet', () => {
    const { categoryCode: _category, ...rest } = query
    const unknown = { ...rest, speciesCode: 9, sort: 'cheapest' as const, radiusKm: 4000 }
    expect(planIn(country(20), unknown)).toEqual({ kind: 'circle' })
  })
})
