import { describe, expect, it } from 'vitest'
import { aboutDistance, kmFromMiles, parseDistanceKm } from '@/shared/units/distance'

describe('distances', () => {
  it.each([
    [0, 'under 1 mi'],
    [kmFromMiles(0.99), 'under 1 mi'],
    [kmFromMiles(1), 'about 1 mi'],
    [kmFromMiles(12.4), 'about 12 mi'],
    [kmFromMiles(49.6), 'about 50 mi'],
    [kmFromMiles(52.4), 'about 50 mi'],
    [kmFromMiles(53), 'about 55 mi'],
    [kmFromMiles(2571), 'about 2,570 mi'],
  ])('%d km reads as %s', (km, shown) => expect(aboutDistance(km, 'us')).toBe(shown))

  it('speaks kilometres to those who want them', () => {
    expect(aboutDistance(0.4, 'metric')).toBe('under 1 km')
    expect(aboutDistance(19.4, 'metric')).toBe('about 19 km')
  })

  it('reads miles and kilometres', () => {
    expect(parseDistanceKm('25 mi', 'metric')).toBeCloseTo(40.2336, 9)
    expect(parseDistanceKm('25', 'us')).toBeCloseTo(40.2336, 9)
    expect(parseDistanceKm('40 km', 'us')).toBe(40)
    expect(parseDistanceKm('far', 'us')).toBeNull()
  })
})
