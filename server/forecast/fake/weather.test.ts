import { describe, expect, it } from 'vitest'

import { airAtHour, distanceKm, weatherOn, type WeatherRule } from './weather'

const COLUMBUS = { lat: 39.96, lng: -83 }
const CINCINNATI = { lat: 39.1, lng: -84.51 }

const rule = (change: Partial<WeatherRule>): WeatherRule => ({
  id: 'one',
  where: null,
  from: '2027-01-15',
  until: '2027-01-17',
  minC: -12,
  maxC: -3,
  ...change,
})

describe('practice weather', () => {
  it('is mild wherever and whenever nothing is set', () => {
    for (let lat = -60; lat <= 70; lat += 7.3) {
      for (const day of ['2027-01-15', '2027-07-04', '2028-02-29']) {
        const { minC, maxC } = weatherOn([], { lat, lng: lat * 2 }, day)
        expect(minC).toBeGreaterThanOrEqual(10)
        expect(minC).toBeLessThanOrEqual(13)
        expect(maxC).toBeGreaterThanOrEqual(17)
        expect(maxC).toBeLessThanOrEqual(21)
      }
    }
    expect(weatherOn([], COLUMBUS, '2027-01-15')).not.toEqual(weatherOn([], CINCINNATI, '2027-01-15'))
  })

  it('takes the latest rule that holds for place and day', () => {
    const near = { ...COLUMBUS, withinKm: 50 }
    const rules = [rule({ id: 'all' }), rule({ id: 'near', where: near, minC: 1, maxC: 2 })]
    expect(weatherOn(rules, COLUMBUS, '2027-01-15')).toMatchObject({ id: 'near' })
    expect(weatherOn(rules, CINCINNATI, '2027-01-17')).toMatchObject({ id: 'all' })
    expect(weatherOn(rules, CINCINNATI, '2027-01-14')).not.toHaveProperty('id')
    expect(weatherOn(rules, CINCINNATI, '2027-01-18')).not.toHaveProperty('id')
    expect(weatherOn([...rules, rule({ id: 'last' })], COLUMBUS, '2027-01-16')).toMatchObject({ id: 'last' })
  })

  it('measures distances on the globe', () => {
    // One degree of latitude on a sphere of 6371 km: 2 π r / 360.
    expect(distanceKm({ lat: 40, lng: -83 }, { lat: 41, lng: -83 })).toBeCloseTo(111.19, 1)
    expect(distanceKm({ lat: 0, lng: 179.5 }, { lat: 0, lng: -179.5 })).toBeCloseTo(111.19, 1)
  })
})

describe('the day curve', () => {
  const days: Record<string, { minC: number; maxC: number }> = {
    '2027-01-14': { minC: 5, maxC: 12 },
    '2027-01-15': { minC: -12, maxC: -3 },
    '2027-01-16': { minC: 0, maxC: 9 },
  }
  const mild = { minC: 10, maxC: 20 }
  const hours = (day: string) =>
    Array.from({ length: 24 }, (_, hour) => airAtHour((one) => days[one] ?? mild, day, hour))

  it('touches the low at 6 and the high at 15, and leaves neither at any hour', () => {
    const air = hours('2027-01-15')
    expect(air[6]).toBe(-12)
    expect(air[15]).toBe(-3)
    expect(Math.min(...air)).toBe(-12)
    expect(Math.max(...air)).toBe(-3)
  })

  it('runs on over midnight without a jump when the days are alike', () => {
    const two = [...hours('2027-03-01'), ...hours('2027-03-02')]
    const steps = two.slice(1).map((air, at) => Math.abs(air - (two[at] ?? NaN)))
    expect(Math.max(...steps)).toBeLessThan(2)
  })
})
