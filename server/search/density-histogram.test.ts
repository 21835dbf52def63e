import { describe, expect, it } from 'vitest'

import { hilbertOfPoint } from '@/shared/domain/geo/hilbert'
import { DensityHistogram, FINEST_LEVEL } from '@/server/search/density-histogram'

const cellOf = (lat: number, lng: number) =>
  Math.floor(hilbertOfPoint({ lat, lng }) / 4 ** (16 - FINEST_LEVEL))

/** One listing in each square of a grid of 0.1 degrees around Cincinnati. */
function evenCountry() {
  const cells = []
  for (let lat = 34; lat < 44; lat += 0.1) {
    for (let lng = -90; lng < -79; lng += 0.1)
      cells.push({ categoryCode: 1, speciesCode: 3, cell: cellOf(lat, lng), count: 1 })
  }
  return new DensityHistogram(cells)
}

describe('how many listings stand where', () => {
  const density = evenCountry()
  const centre = { lat: 39.125, lng: -84.525 }
  const perKm2 = 1 / (11.1195 * 11.1195 * Math.cos((39.125 * Math.PI) / 180))

  it.each([25, 50, 100, 200, 400])('is about right within %i km', (km) => {
    const truth = Math.PI * km * km * perKm2
    expect(density.within({}, centre, km) / truth).toBeGreaterThan(0.85)
    expect(density.within({}, centre, km) / truth).toBeLessThan(1.15)
  })

  it('counts by category and by species, and knows the category of a species', () => {
    const all = density.within({}, centre, 100)
    expect(density.within({ categoryCode: 1 }, centre, 100)).toBe(all)
    expect(density.within({ speciesCode: 3 }, centre, 100)).toBe(all)
    expect(density.within({ categoryCode: 2 }, centre, 100)).toBe(0)
    expect(density.categoryOf(3)).toBe(1)
    expect(density.categoryOf(4)).toBeNull()
  })

  it('sees over the date line', () => {
    const islands = new DensityHistogram([
      { categoryCode: 1, speciesCode: 3, cell: cellOf(52, 179.9), count: 7 },
    ])
    expect(islands.within({}, { lat: 52, lng: -179.9 }, 60)).toBeGreaterThan(3)
  })

  it('is empty in an empty country', () => {
    expect(new DensityHistogram([]).within({}, centre, 500)).toBe(0)
    expect(new DensityHistogram([]).total({})).toBe(0)
  })
})
