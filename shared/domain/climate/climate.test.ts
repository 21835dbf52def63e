import { describe, expect, it } from 'vitest'

import { climateGrid, normalsAt } from '@/shared/domain/climate/climate-grid'
import { airOfHourC } from '@/shared/domain/climate/day-curve'
import { dayOfYear } from '@/shared/domain/climate/day-of-year'
import { designWeather } from '@/shared/domain/climate/design-weather'
import { normalChance, normalQuantile } from '@/shared/domain/climate/normal-quantile'
import { normalDay } from '@/shared/domain/climate/normal-day'
import { readClimateCsv } from '@/shared/domain/climate/read-climate-csv'
import { chanceOfOneNight, chanceOfSomeNight } from '@/shared/domain/climate/window-chance'

const flat = (value: number) => Array.from({ length: 12 }, () => value)
const node = (lat: number, lng: number, minC: number) => ({
  lat,
  lng,
  normals: { minC: flat(minC), maxC: flat(minC + 10), sdMinC: flat(0.4), sdMaxC: flat(4) },
})

describe('the climate table', () => {
  const grid = climateGrid([node(40, -90, 0), node(40, -89.5, 4), node(40.5, -90, 8)])

  it('is read between its nodes, without the missing ones', () => {
    expect(normalsAt(grid, 40, -89.75)?.minC[0]).toBeCloseTo(2, 10)
    expect(normalsAt(grid, 40.25, -89.75)?.minC[0]).toBeCloseTo(4, 10)
    expect(normalsAt(grid, 40, -90)?.minC[0]).toBe(0)
    expect(normalsAt(grid, 45, -90)).toBeNull()
    expect(normalsAt(grid, NaN, -90)).toBeNull()
  })

  it('never spreads less than 1 °C', () => {
    const normals = normalsAt(grid, 40, -90)
    expect(normals && normalDay(normals, 14)?.sdMinC).toBe(1)
    expect(normals && normalDay(normals, 365)).toBeNull()
  })

  it('is not read from a broken line', () => {
    expect(() => readClimateCsv('lat,lng\n19,-156,14,15')).toThrow('broken line')
  })

  it('knows the days of the calendar and no others', () => {
    expect(dayOfYear('2027-01-01')).toBe(0)
    expect(dayOfYear('2027-12-31')).toBe(364)
    expect(dayOfYear('2028-02-29')).toBe(dayOfYear('2028-02-28'))
    for (const wrong of ['2027-02-29', '2027-13-01', '2027-1-1', 'soon', '2027-04-31'])
      expect(dayOfYear(wrong)).toBeNull()
  })
})

describe('chances', () => {
  it('turn into spreads and back', () => {
    for (const chance of [0.001, 0.02, 0.1, 0.5, 0.9, 0.99]) {
      expect(normalChance(normalQuantile(chance) ?? NaN)).toBeCloseTo(chance, 6)
    }
    expect(normalQuantile(0)).toBeNull()
  })

  // Pittsburgh 1991-2020, p = 12.9 %: the rule 19.8, 26.2, 32.1, 37.5 %, counted 19.7, 25.8, 31.2, 36.1 %.
  it('of several nights follow the counted ones', () => {
    const counted = [0.197, 0.258, 0.312, 0.361]
    counted.forEach((share, at) =>
      expect(Math.abs(chanceOfSomeNight(0.129, at + 2) - share)).toBeLessThan(0.015),
    )
    expect(chanceOfSomeNight(0.129, 2)).toBeCloseTo(0.198, 3)
    expect(chanceOfSomeNight(chanceOfOneNight(0.1, 3), 3)).toBeCloseTo(0.1, 10)
  })
})

describe('the days a trip is judged by', () => {
  const day = { minC: 4, maxC: 15, sdMinC: 5, sdMaxC: 6 }

  it('are colder and hotter the more nights and the more certainty', () => {
    const [one, three] = [designWeather(day, 1, 0.9), designWeather(day, 3, 0.9)]
    const surer = designWeather(day, 1, 0.95)
    expect(one?.cold.minC).toBeCloseTo(4 - 1.28155 * 5.5, 3)
    expect(one?.hot.maxC).toBeCloseTo(15 + 1.28155 * 6, 3)
    expect(three?.cold.minC).toBeLessThan(one?.cold.minC ?? 0)
    expect(surer?.hot.maxC).toBeGreaterThan(one?.hot.maxC ?? 0)
    expect(designWeather(day, 1, 0.4)).toBeNull()
  })

  it('run from the coldest hour to the warmest and back', () => {
    expect(airOfHourC(day, 6)).toBeCloseTo(4, 10)
    expect(airOfHourC(day, 15)).toBeCloseTo(15, 10)
    expect(airOfHourC(day, 39)).toBeCloseTo(15, 10)
    expect(airOfHourC(day, 23)).toBeGreaterThan(airOfHourC(day, 29))
  })
})
