import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'

import { hilbertCentre, hilbertIndex, hilbertOfPoint, hilbertSquare } from '@/shared/domain/geo/hilbert'

const side = fc.integer({ min: 0, max: 65_535 })

describe('the Hilbert index', () => {
  it('walks the four quarters south-west, north-west, north-east, south-east', () => {
    expect(
      [
        [0, 0],
        [0, 1],
        [1, 1],
        [1, 0],
      ].map(([ix = 0, iy = 0]) => hilbertIndex(ix, iy, 1)),
    ).toEqual([0, 1, 2, 3])
  })

  it('steps to a neighbouring square every time and misses none', () => {
    const seen = new Set<number>()
    for (let at = 0; at < 4096; at++) {
      const { ix, iy } = hilbertSquare(at, 6)
      const next = hilbertSquare(Math.min(at + 1, 4095), 6)
      seen.add(ix * 64 + iy)
      expect(Math.abs(next.ix - ix) + Math.abs(next.iy - iy)).toBe(at === 4095 ? 0 : 1)
    }
    expect(seen.size).toBe(4096)
  })

  it('comes back to the same square, up to the last bit', () => {
    fc.assert(
      fc.property(side, side, (ix, iy) => {
        const index = hilbertIndex(ix, iy)
        expect(index).toBeGreaterThanOrEqual(0)
        expect(index).toBeLessThan(2 ** 32)
        expect(hilbertSquare(index)).toEqual({ ix, iy })
      }),
    )
    expect(hilbertSquare(2 ** 32 - 1)).toEqual({ ix: 65_535, iy: 0 })
  })

  it('is a quadtree: a prefix of 2·L bits is the square of level L', () => {
    fc.assert(
      fc.property(side, side, fc.integer({ min: 1, max: 15 }), (ix, iy, level) => {
        const coarse = hilbertIndex(ix >> (16 - level), iy >> (16 - level), level)
        expect(Math.floor(hilbertIndex(ix, iy) / 4 ** (16 - level))).toBe(coarse)
      }),
    )
  })

  it('takes the date line and the poles as ordinary places', () => {
    expect(hilbertOfPoint({ lat: 10, lng: 180 })).toBe(hilbertOfPoint({ lat: 10, lng: -180 }))
    expect(hilbertSquare(hilbertOfPoint({ lat: 90, lng: 0 })).iy).toBe(65_535)
    expect(hilbertSquare(hilbertOfPoint({ lat: -90, lng: 0 })).iy).toBe(0)
  })

  it('has its centre less than half a square away', () => {
    const centre = hilbertCentre(hilbertOfPoint({ lat: 39.125, lng: -84.525 }))
    expect(Math.abs(centre.lat - 39.125)).toBeLessThanOrEqual(90 / 65_536)
    expect(Math.abs(centre.lng + 84.525)).toBeLessThanOrEqual(180 / 65_536)
  })
})
