import { toScreen, toWorld, type MapView, type Point, type Size } from './map-view'

import type { MapPinFacts } from './map.types'

export interface PinGroup {
  /** Stable while the zoom stays: cells of the grid do not move with the view. */
  key: string
  at: Point
  pins: MapPinFacts[]
  count: number
}

const cellPx = 52

/** Pins of one grid cell become one group; groups outside the view are left out. */
export function clusterPins(pins: readonly MapPinFacts[], view: MapView, size: Size): PinGroup[] {
  const cell = cellPx / snapScale(view.scale)
  const groups = new Map<string, MapPinFacts[]>()
  for (const pin of pins) {
    const world = toWorld(pin)
    const key = `${Math.floor(world.x / cell)} ${Math.floor(world.y / cell)}`
    const group = groups.get(key)
    if (group) group.push(pin)
    else groups.set(key, [pin])
  }
  return Array.from(groups, ([key, group]) => placeGroup(key, group, { view, size })).filter(({ at }) =>
    isInView(at, size),
  )
}

// Half-steps of zoom: a grid that changed with every pixel of a pinch would flicker.
function snapScale(scale: number): number {
  return 2 ** (Math.round(Math.log2(scale) * 2) / 2)
}

function placeGroup(
  key: string,
  pins: MapPinFacts[],
  { view, size }: { view: MapView; size: Size },
): PinGroup {
  const middle = {
    lat: pins.reduce((sum, pin) => sum + pin.lat, 0) / pins.length,
    lng: pins.reduce((sum, pin) => sum + pin.lng, 0) / pins.length,
  }
  const count = pins.reduce((sum, pin) => sum + (pin.count ?? 1), 0)
  return { key, pins, count, at: toScreen(view, size, middle) }
}

function isInView({ x, y }: Point, { widthPx, heightPx }: Size): boolean {
  return x > -20 && y > -20 && x < widthPx + 20 && y < heightPx + 20
}
