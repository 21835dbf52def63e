import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { earthPoint, kmOfSquaredChord, squaredChord, squaredChordOfKm } from '@/shared/domain/geo/earth-point'

const place = fc.record({
  lat: fc.double({ min: -90, max: 90, noNaN: true }),
  lng: fc.double({ min: -180, max: 180, noNaN: true }),
})

describe('points on the sphere', () => {
  it('lie on it, to a decimetre', () => {
    expect(earthPoint({ lat: 0, lng: 0 })).toEqual({ x: 63_710_088, y: 0, z: 0 })
    expect(earthPoint({ lat: 90, lng: 77 })).toMatchObject({ z: 63_710_088 })
    fc.assert(
      fc.property(place, (at) => {
        const { x, y, z } = earthPoint(at)
        expect(Math.abs(Math.hypot(x, y, z) - 63_710_088)).toBeLessThan(1)
      }),
    )
  })

  it('are the same on both sides of the date line', () => {
    expect(squaredChord(earthPoint({ lat: 12, lng: 180 }), earthPoint({ lat: 12, lng: -180 }))).toBe(0)
  })

  it('give whole squares that 64 bits and a double both hold exactly within 9,000 km', () => {
    expect(squaredChordOfKm(9000)).toBeLessThan(Number.MAX_SAFE_INTEGER)
    expect(
      Number.isInteger(squaredChord(earthPoint({ lat: 39, lng: -84 }), earthPoint({ lat: 61, lng: -149 }))),
    ).toBe(true)
  })

  it('turn distance to chord and back within a decimetre or so', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.1, max: 9000, noNaN: true }), (km) => {
        expect(kmOfSquaredChord(squaredChordOfKm(km))).toBeCloseTo(km, 6)
      }),
    )
    expect(kmOfSquaredChord(0)).toBe(0)
    expect(squaredChordOfKm(0)).toBe(0)
  })

  it('never get nearer when the chord grows', () => {
    fc.assert(
      fc.property(fc.nat(4e14), fc.nat(4e14), (a, b) => {
        expect(Math.sign(kmOfSquaredChord(a) - kmOfSquaredChord(b))).toBe(Math.sign(a - b))
      }),
    )
  })

  it('cannot be farther apart than half the girth of the Earth', () => {
    expect(kmOfSquaredChord(1e18)).toBeCloseTo(20_015.1, 1)
    expect(squaredChordOfKm(30_000)).toBe(squaredChordOfKm(20_016))
  })
})
