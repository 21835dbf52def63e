import { describe, expect, it } from 'vitest'
import { mergeZips } from '@/seed/places/merge-zips'

const named = (zip: string, state: string, [latitude, longitude]: [number, number]) => ({
  zip,
  city: 'Mill Creek',
  state,
  country: 'US',
  latitude,
  longitude,
})

describe('merging ZIP lists', () => {
  it('takes the census point where there is one, and the list’s own elsewhere', () => {
    const points = { '45001': { latitude: 39.1, longitude: -84.9 } }
    expect(mergeZips(points, [named('45002', 'OH', [39.2, -84.7]), named('45001', 'OH', [39, -84])])).toEqual(
      [
        { zip: '45001', city: 'Mill Creek', state: 'OH', lat: 39.1, lng: -84.9 },
        { zip: '45002', city: 'Mill Creek', state: 'OH', lat: 39.2, lng: -84.7 },
      ],
    )
  })

  it('drops military ZIPs and those without a place', () => {
    const rows = [
      named('09001', 'AE', [38.1, 15.7]),
      named('34001', 'AA', [0, 0]),
      named('45003', 'OH', [0, 0]),
    ]
    expect(mergeZips({}, rows)).toEqual([])
  })

  it('names a young ZIP after its nearest neighbour', () => {
    const points = { '75036': { latitude: 33.1, longitude: -96.9 } }
    const rows = [
      { ...named('75035', 'TX', [33.2, -96.8]), city: 'Frisco' },
      named('90001', 'CA', [34, -118.2]),
    ]
    expect(mergeZips(points, rows)[0]).toMatchObject({ zip: '75035', city: 'Frisco' })
    expect(mergeZips(points, rows)[1]).toMatchObject({ zip: '75036', city: 'Frisco', state: 'TX', lat: 33.1 })
  })
})
