import { describe, expect, it } from 'vitest'

import { areaOf, fitArea, kmPerPixel, pan, toScreen, zoom } from './map-view'

const dayton = { lat: 39.759, lng: -84.192 }
const cincinnati = { lat: 39.103, lng: -84.512 }
const size = { widthPx: 400, heightPx: 600 }
const view = fitArea({ center: dayton, radiusKm: 40 }, size)

describe('the view of the map', () => {
  it('puts its centre in the middle', () => {
    expect(toScreen(view, size, dayton)).toEqual({ x: 200, y: 300 })
  })

  it('draws north up and east to the right', () => {
    const at = toScreen(view, size, { lat: dayton.lat + 0.1, lng: dayton.lng + 0.1 })
    expect(at.x).toBeGreaterThan(200)
    expect(at.y).toBeLessThan(300)
  })

  it('shows Cincinnati, 78 km away, at that many kilometres of pixels', () => {
    // Haversine on the mean sphere between the two points above: 78.0 km.
    const at = toScreen(view, size, cincinnati)
    const km = Math.hypot(at.x - 200, at.y - 300) * kmPerPixel(view)
    expect(km).toBeGreaterThan(77)
    expect(km).toBeLessThan(79)
  })

  it('gives back the area it was fitted to', () => {
    const area = areaOf(view, size)
    expect(area.center).toEqual(dayton)
    expect(area.radiusKm).toBeCloseTo(40, 6)
  })

  it('moves what was shown by as many pixels as the finger moved', () => {
    const moved = pan(view, { x: 30, y: -50 })
    const at = toScreen(moved, size, dayton)
    expect(at.x).toBeCloseTo(230, 6)
    expect(at.y).toBeCloseTo(250, 6)
  })

  it('keeps the place under the finger while zooming', () => {
    const about = { x: 80, y: -120 }
    const before = toScreen(pan(view, { x: -about.x, y: -about.y }), size, dayton)
    const place = pan(view, { x: -about.x, y: -about.y }).center
    const at = toScreen(zoom(view, 3, about), size, place)
    expect(before).not.toEqual({ x: 200, y: 300 })
    expect(at.x).toBeCloseTo(200 + about.x, 6)
    expect(at.y).toBeCloseTo(300 + about.y, 6)
  })

  it('neither zooms past a few streets nor out of the continent', () => {
    expect(kmPerPixel(zoom(view, 1e9))).toBeGreaterThan(0.005)
    expect(kmPerPixel(zoom(view, 1e-9))).toBeLessThan(20)
  })
})
