import { getDistance, getGreatCircleBearing } from 'geolib'
import { describe, expect, it } from 'vitest'

import { bearingWords } from '@/shared/domain/geo/bearing-words'
import { distanceKm } from '@/shared/domain/geo/distance'
import { EARTH_RADIUS_M } from '@/shared/domain/geo/earth-point'

// geolib 3.3 works on a sphere of this radius (its own constant) and by the spherical law of cosines.
const GEOLIB_RADIUS_M = 6_378_137

const places = {
  cincinnati: { lat: 39.125, lng: -84.525 },
  covington: { lat: 39.075, lng: -84.525 },
  louisville: { lat: 38.275, lng: -85.775 },
  miami: { lat: 25.775, lng: -80.175 },
  seattle: { lat: 47.625, lng: -122.325 },
  guam: { lat: 13.475, lng: 144.775 },
  honolulu: { lat: 21.325, lng: -157.875 },
  aleutians: { lat: 51.875, lng: -176.625 },
}
const pairs = Object.entries(places).flatMap(([a, from], at) =>
  Object.entries(places)
    .slice(at + 1)
    .map(([b, to]) => ({ name: `${a}–${b}`, from, to })),
)

describe('distances and bearings against other people’s figures', () => {
  it.each(pairs)('$name agrees with geolib to 2 m', ({ from, to }) => {
    const theirs = (getDistance(from, to, 0.001) / GEOLIB_RADIUS_M) * EARTH_RADIUS_M
    // Our points are rounded to decimetres; the law of cosines loses about a metre over short distances.
    expect(Math.abs(distanceKm(from, to) * 1000 - theirs)).toBeLessThan(2)
  })

  it('counts every pair', () => expect(pairs).toHaveLength(28))

  // E. Williams, Aviation Formulary, worked example LAX to JFK: 0.623585 radians, course 66° (figures from memory).
  const lax = { lat: 33 + 57 / 60, lng: -(118 + 24 / 60) }
  const jfk = { lat: 40 + 38 / 60, lng: -(73 + 47 / 60) }

  it('agrees with the worked example of the Aviation Formulary', () => {
    expect((distanceKm(lax, jfk) * 1000) / EARTH_RADIUS_M).toBeCloseTo(0.623585, 6)
    expect(getGreatCircleBearing(lax, jfk)).toBeCloseTo(66, 0)
    expect(bearingWords(lax, jfk)).toBe('north-east')
  })

  it('has 111.195 km to a degree of latitude, the girth of that sphere over 360', () => {
    expect(distanceKm({ lat: 39, lng: -84 }, { lat: 40, lng: -84 })).toBeCloseTo(111.195, 3)
  })
})
