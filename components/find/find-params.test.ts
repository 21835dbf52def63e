import { describe, expect, it } from 'vitest'

import { readFind, toFilters, writeFind, type FindState } from './find-params'

const wish: FindState = {
  near: '45202',
  withinKm: 41,
  category: 'fish',
  species: 'nile_tilapia',
  sizeFromMm: 51,
  sizeToMm: 102,
  count: 20,
  from: '2027-01-15',
  until: '2027-02-01',
  mostCents: 150,
  pickup: 'yes',
  shipWeek: 15,
  sort: 'cheapest',
}

describe('what Find asks, kept in the address', () => {
  it('comes back from its own address unchanged', () => {
    expect(readFind(writeFind(wish))).toEqual(wish)
  })

  it('leaves out what nobody asked for', () => {
    expect(readFind({})).toEqual({})
    expect(readFind(writeFind({ sort: 'nearest' }))).toEqual({})
  })

  it('drops parts that cannot be meant and keeps the rest', () => {
    const mistyped = {
      near: 'Dayton',
      withinKm: '-5',
      count: '1e9',
      from: '2027-13-01',
      sort: 'best',
      species: 'x;y',
    }
    expect(readFind({ ...mistyped, category: 'worms' })).toEqual({ category: 'worms' })
  })

  it('drops a day that is not on the calendar', () => {
    expect(readFind({ from: '2027-02-31', until: '2028-02-29' })).toEqual({ until: '2028-02-29' })
    expect(readFind({ from: '2027-02-29' })).toEqual({})
  })

  it('reads sizes and days that were turned round as meant', () => {
    const turned = { sizeFromMm: '102', sizeToMm: '51', from: '2027-02-01', until: '2027-01-15' }
    expect(readFind(turned)).toEqual({
      ...{ sizeFromMm: 51, sizeToMm: 102 },
      ...{ from: '2027-01-15', until: '2027-02-01' },
    })
  })

  it('takes a location cell, never a coordinate', () => {
    expect(readFind({ near: '50.2582.1909' }).near).toBe('50.2582.1909')
    expect(readFind({ near: '39.10312,-84.51202' }).near).toBeUndefined()
  })

  it('asks for 100 miles around the place when no distance was chosen', () => {
    expect(toFilters({ sort: 'soonest' }, '45202')).toEqual({ near: '45202', withinKm: 161 })
  })
})
