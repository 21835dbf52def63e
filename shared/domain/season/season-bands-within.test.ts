import { expect, it } from 'vitest'

import { seasonBandAt } from '@/shared/domain/season/season-band'
import { seasonBandsWithin } from '@/shared/domain/season/season-bands-within'

const KM_PER_DEGREE = 111.195

it.each([
  ['Cincinnati', 39.125, -84.525],
  ['Denver, between plain and mountain', 39.74, -104.99],
  ['Anchorage, where meridians are close', 61.2, -149.9],
  ['Honolulu', 21.3, -157.85],
])('holds the band of every place in a circle around %s', (_, lat, lng) => {
  for (const radiusKm of [1, 25, 160, 600, 1000]) {
    const bands = seasonBandsWithin({ lat, lng }, radiusKm)
    for (let bearing = 0; bearing < 360; bearing += 7) {
      for (const share of [0.2, 0.6, 0.9, 0.999]) {
        const degrees = (radiusKm * share) / KM_PER_DEGREE
        const angle = (bearing * Math.PI) / 180
        const north = Math.asin(
          Math.sin((lat * Math.PI) / 180) * Math.cos((degrees * Math.PI) / 180) +
            Math.cos((lat * Math.PI) / 180) * Math.sin((degrees * Math.PI) / 180) * Math.cos(angle),
        )
        const east = Math.atan2(
          Math.sin(angle) * Math.sin((degrees * Math.PI) / 180) * Math.cos((lat * Math.PI) / 180),
          Math.cos((degrees * Math.PI) / 180) - Math.sin((lat * Math.PI) / 180) * Math.sin(north),
        )
        const band = seasonBandAt((north * 180) / Math.PI, lng + (east * 180) / Math.PI)
        if (band !== null) expect(bands).toContain(band)
      }
    }
  }
})

it('leaves most bands out of a small circle', () => {
  expect(seasonBandsWithin({ lat: 39.125, lng: -84.525 }, 160).size).toBeLessThan(12)
  expect(seasonBandsWithin({ lat: 0, lng: 0 }, 160).size).toBe(0)
})
