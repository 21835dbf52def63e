import { describe, expect, it } from 'vitest'

import { clusterPins } from './cluster-pins'
import { fitArea, pan, zoom } from './map-view'

const size = { widthPx: 400, heightPx: 400 }
const dayton = { lat: 39.759, lng: -84.192 }
const view = fitArea({ center: dayton, radiusKm: 40 }, size)
const pin = (id: string, east: number, count?: number) => ({
  id,
  lat: dayton.lat,
  lng: dayton.lng + east,
  label: id,
  count,
})

describe('pins on the map', () => {
  it('keeps pins that lie apart apart', () => {
    expect(clusterPins([pin('a', -0.3), pin('b', 0.3)], view, size)).toHaveLength(2)
  })

  it('puts pins of one spot together and adds up what they stand for', () => {
    const [group, ...others] = clusterPins([pin('a', 0.001, 3), pin('b', 0.001)], view, size)
    expect(others).toEqual([])
    expect(group?.count).toBe(4)
    expect(group?.pins.map(({ id }) => id)).toEqual(['a', 'b'])
  })

  it('opens a group when the view comes closer', () => {
    const pins = [pin('a', 0.001), pin('b', 0.03)]
    const close = zoom(view, 16)
    const apart = clusterPins(pins, close, size)
    expect(new Set(apart.map(({ key }) => key)).size).toBe(2)
  })

  it('keeps its groups while the map is dragged', () => {
    const pins = [pin('a', -0.1), pin('b', 0), pin('c', 0.1)]
    const keys = (at: typeof view) => clusterPins(pins, at, size).map(({ key }) => key)
    expect(keys(pan(view, { x: 17, y: 9 }))).toEqual(keys(view))
  })

  it('leaves out what is not in view', () => {
    expect(clusterPins([pin('far', 5)], view, size)).toEqual([])
  })

  it('holds ten thousand pins in a few hundred groups', () => {
    const pins = Array.from({ length: 10_000 }, (_, n) => pin(String(n), ((n % 100) - 50) / 100))
    const groups = clusterPins(pins, view, size)
    expect(groups.length).toBeLessThan(100)
    expect(groups.reduce((sum, { count }) => sum + count, 0)).toBeGreaterThan(9000)
  })
})
