import { describe, expect, it } from 'vitest'

import { circleCover } from '@/shared/domain/geo/circle-cover'
import { earthPoint, kmOfSquaredChord, squaredChord, squaredChordOfKm } from '@/shared/domain/geo/earth-point'
import { hilbertOfPoint } from '@/shared/domain/geo/hilbert'
import type { HilbertRange } from '@/shared/domain/geo/hilbert-cover'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

/** mulberry32: the same points every run. */
function chances(seed: number): () => number {
  let state = seed
  return () => {
    state = (state + 0x6d2b79f5) | 0
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
}

const radians = Math.PI / 180

/** A point at most `km` away, evenly over the disc. */
function pointNear(centre: CellPoint, km: number, chance: () => number): CellPoint {
  const turn = (km * Math.sqrt(chance())) / 6371.0088
  const way = chance() * 2 * Math.PI
  const lat = centre.lat * radians
  const sinLat = Math.sin(lat) * Math.cos(turn) + Math.cos(lat) * Math.sin(turn) * Math.cos(way)
  const aside = Math.atan2(
    Math.sin(way) * Math.sin(turn) * Math.cos(lat),
    Math.cos(turn) - Math.sin(lat) * sinLat,
  )
  return { lat: Math.asin(sinLat) / radians, lng: ((centre.lng + aside / radians + 540) % 360) - 180 }
}

const holds = (ranges: HilbertRange[], at: number) => ranges.some(({ from, to }) => at >= from && at <= to)
const radiiKm = [1, 5, 25, 100, 200, 500, 800, 4000]

function somewhere(index: number, chance: () => number): CellPoint {
  const lat = chance() * 178 - 89
  // Every fourth circle lies across the date line.
  const lng = index % 4 === 0 ? 179 + chance() * 2 : chance() * 360 - 180
  return { lat, lng: lng > 180 ? lng - 360 : lng }
}

describe('the cover of a circle', () => {
  it('misses none of 240,000 points, at the date line and up to 89 degrees too', () => {
    const chance = chances(42)
    let tested = 0
    let missed = 0
    for (let circle = 0; circle < 800; circle++) {
      const centre = somewhere(circle, chance)
      const radiusKm = radiiKm[circle % radiiKm.length] ?? 1
      const ranges = circleCover({ centre, radiusKm })
      const from = earthPoint(centre)
      const most = squaredChordOfKm(radiusKm)
      for (let tries = 0; tries < 300; tries++) {
        const point = pointNear(centre, radiusKm, chance)
        if (squaredChord(from, earthPoint(point)) > most) continue
        tested++
        if (!holds(ranges, hilbertOfPoint(point))) missed++
      }
    }
    expect({ missed, enough: tested > 239_000 }).toEqual({ missed: 0, enough: true })
  })

  it('leaves out only what an earlier page has, when it begins at a distance', () => {
    const chance = chances(7)
    let missed = 0
    let spared = 0
    for (let circle = 0; circle < 400; circle++) {
      const centre = somewhere(circle, chance)
      const radiusKm = radiiKm[circle % radiiKm.length] ?? 1
      const ring = circleCover({ centre, radiusKm, beyondKm: radiusKm * 0.7 })
      const from = earthPoint(centre)
      for (let tries = 0; tries < 200; tries++) {
        const point = pointNear(centre, radiusKm, chance)
        const km = kmOfSquaredChord(squaredChord(from, earthPoint(point)))
        const held = holds(ring, hilbertOfPoint(point))
        if (km >= radiusKm * 0.7 && km <= radiusKm && !held) missed++
        if (km < radiusKm * 0.7 && !held) spared++
      }
    }
    expect(missed).toBe(0)
    expect(spared).toBeGreaterThan(10_000)
  })

  it('takes little ground beyond the circle, in few ranges', () => {
    const side = 65_536
    for (const lat of [26, 39.125, 48]) {
      for (const radiusKm of [25, 100, 500]) {
        const ranges = circleCover({ centre: { lat, lng: -84.525 }, radiusKm })
        const squares = ranges.reduce((sum, { from, to }) => sum + to - from + 1, 0)
        const squareKm2 = (360 / side) * (180 / side) * 111.195 ** 2 * Math.cos(lat * radians)
        expect((squares * squareKm2) / (Math.PI * radiusKm ** 2)).toBeLessThan(1.75)
        expect(ranges.length).toBeLessThanOrEqual(24)
      }
    }
  })

  it('is sorted, and neighbours are one range', () => {
    const ranges = circleCover({ centre: { lat: 39.125, lng: -84.525 }, radiusKm: 160 })
    ranges.slice(1).forEach((range, at) => expect(range.from).toBeGreaterThan((ranges[at]?.to ?? 0) + 1))
  })

  it('is the whole world when the circle is', () => {
    expect(circleCover({ centre: { lat: 0, lng: 0 }, radiusKm: 20_100 })).toEqual([
      { from: 0, to: 2 ** 32 - 1 },
    ])
  })
})
