import { hilbertCover, type HilbertRange, type WorldBox } from '@/shared/domain/geo/hilbert-cover'
import { readClusters, readPlaces, type SummedMark } from '@/server/search/map-cell-store'
import { mapLevelOf, PLACES_FROM_ZOOM } from '@/server/search/map-levels'

export interface MapView {
  /** Degrees; west may be greater than east, across the date line. */
  bounds: WorldBox
  /** 0: the world in 256 points. */
  zoom: number
  categoryCode?: number
}

export interface Pin {
  /** The same mark keeps its name while the view moves. */
  id: string
  lat: number
  lng: number
  count: number
}

const MOST_PINS = 500

function halves(box: WorldBox): WorldBox[] {
  if (box.west <= box.east) return [box]
  return [
    { ...box, east: 180 },
    { ...box, west: -180 },
  ]
}

function boxCover(box: WorldBox): HilbertRange[] {
  return hilbertCover((quad) => {
    if (quad.south > box.north || quad.north < box.south || quad.west > box.east || quad.east < box.west)
      return 'out'
    const inside =
      quad.south >= box.south && quad.north <= box.north && quad.west >= box.west && quad.east <= box.east
    return inside ? 'in' : 'edge'
  })
}

function isInside({ bounds }: MapView, { lat, lng }: Pin): boolean {
  if (lat < bounds.south || lat > bounds.north) return false
  return bounds.west <= bounds.east
    ? lng >= bounds.west && lng <= bounds.east
    : lng >= bounds.west || lng <= bounds.east
}

function pinOf(prefix: string, { key, count, sumLatE6, sumLngE6 }: SummedMark): Pin {
  const round = (sum: number) => Math.round(sum / count) / 1e6
  return { id: `${prefix}.${key}`, lat: round(sumLatE6), lng: round(sumLngE6), count }
}

/** A view of 4,000 points across is at most so wide; asking for places over a continent gives clusters. */
function zoomOf({ bounds, zoom }: MapView): number {
  const wide = bounds.west <= bounds.east ? bounds.east - bounds.west : bounds.east - bounds.west + 360
  return Math.min(zoom, Math.floor(Math.log2((4_000 * 360) / (256 * Math.max(wide, 0.001)))))
}

/** Clusters when far away, places when near; the largest first. A place is a location cell, never a door. */
export async function findPins(view: MapView): Promise<Pin[]> {
  const ranges = halves(view.bounds).flatMap(boxCover)
  const zoom = zoomOf(view)
  const level = mapLevelOf(zoom)
  const marks =
    zoom >= PLACES_FROM_ZOOM
      ? (await readPlaces(ranges, view.categoryCode)).map((mark) => pinOf('p', mark))
      : (await readClusters(level, ranges, view.categoryCode)).map((mark) => pinOf(`c${level}`, mark))
  return marks
    .filter((pin) => isInside(view, pin))
    .sort((a, b) => b.count - a.count || (a.id < b.id ? -1 : 1))
    .slice(0, MOST_PINS)
}
