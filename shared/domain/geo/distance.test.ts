import { describe, expect, it } from 'vitest'

import { distanceKm } from '@/shared/domain/geo/distance'

describe('the distance between two places', () => {
  it('is the same both ways and nothing inside one cell', () => {
    const cincinnati = { lat: 39.125, lng: -84.525 }
    const lexington = { lat: 38.025, lng: -84.475 }
    expect(distanceKm(cincinnati, lexington)).toBe(distanceKm(lexington, cincinnati))
    expect(distanceKm(cincinnati, cincinnati)).toBe(0)
  })

  it('is a quarter of a great circle from a pole to the equator', () => {
    expect(distanceKm({ lat: 90, lng: 0 }, { lat: 0, lng: 123 })).toBeCloseTo((6371.0088 * Math.PI) / 2, 3)
  })
})
