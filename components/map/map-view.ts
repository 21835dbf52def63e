import type { LatLng, MapArea } from './map.types'

/** What the map shows: its centre and how many pixels one radian of longitude is wide. */
export interface MapView {
  center: LatLng
  scale: number
}

export interface Size {
  widthPx: number
  heightPx: number
}

export interface Point {
  x: number
  y: number
}

export const earthRadiusKm = 6371.0088 // mean radius, IUGG
const fitShare = 0.45
const minScale = 400
const maxScale = 600_000
const latLimit = 72

const radians = (degrees: number) => (degrees * Math.PI) / 180
const degrees = (angle: number) => (angle * 180) / Math.PI
const clamp = (value: number, low: number, high: number) => Math.min(high, Math.max(low, value))

/** Mercator on a sphere, in radians: x grows to the east, y to the south. */
export function toWorld({ lat, lng }: LatLng): Point {
  return { x: radians(lng), y: -Math.log(Math.tan(Math.PI / 4 + radians(lat) / 2)) }
}

function fromWorld({ x, y }: Point): LatLng {
  return {
    lat: clamp(degrees(2 * Math.atan(Math.exp(-y)) - Math.PI / 2), -latLimit, latLimit),
    lng: degrees(x),
  }
}

export function toScreen(view: MapView, size: Size, place: LatLng): Point {
  const middle = toWorld(view.center)
  const world = toWorld(place)
  return {
    x: size.widthPx / 2 + (world.x - middle.x) * view.scale,
    y: size.heightPx / 2 + (world.y - middle.y) * view.scale,
  }
}

/** The view in which a circle of this radius fills nine tenths of the shorter side. */
export function fitArea({ center, radiusKm }: MapArea, size: Size): MapView {
  const radiusWorld = radiusKm / (earthRadiusKm * Math.cos(radians(center.lat)))
  const scale = (fitShare * Math.min(size.widthPx, size.heightPx)) / radiusWorld
  return { center, scale: clamp(scale, minScale, maxScale) }
}

/** The area a view fits: the inverse of fitArea. */
export function areaOf(view: MapView, size: Size): MapArea {
  const radiusPx = fitShare * Math.min(size.widthPx, size.heightPx)
  return { center: view.center, radiusKm: radiusPx * kmPerPixel(view) }
}

export function kmPerPixel(view: MapView): number {
  return (earthRadiusKm * Math.cos(radians(view.center.lat))) / view.scale
}

/** The content follows the finger: dx, dy in pixels. */
export function pan(view: MapView, { x: dx, y: dy }: Point): MapView {
  const middle = toWorld(view.center)
  return { ...view, center: fromWorld({ x: middle.x - dx / view.scale, y: middle.y - dy / view.scale }) }
}

/** Zooms about a point given in pixels from the middle of the map, which stays under the finger. */
export function zoom(view: MapView, factor: number, about: Point = { x: 0, y: 0 }): MapView {
  const scale = clamp(view.scale * factor, minScale, maxScale)
  const middle = toWorld(view.center)
  const keep = 1 / view.scale - 1 / scale
  return { scale, center: fromWorld({ x: middle.x + about.x * keep, y: middle.y + about.y * keep }) }
}
