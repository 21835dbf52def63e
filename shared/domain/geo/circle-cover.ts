import { EARTH_RADIUS_M } from '@/shared/domain/geo/earth-point'
import { hilbertCover, type HilbertRange, type WorldBox } from '@/shared/domain/geo/hilbert-cover'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

const RADIANS = Math.PI / 180
/** Points are rounded to decimetres and radii to dm²; a metre each way is more than both together. */
const MARGIN_KM = 0.001

export interface Ring {
  centre: CellPoint
  radiusKm: number
  /** What lies wholly nearer than this is left out (an earlier page has it). 0: a full circle. */
  beyondKm?: number
}

const sinSquared = (angle: number) => Math.sin(angle / 2) ** 2

/** sin² of half the angle that a distance over the ground spans; grows up to half the Earth's girth. */
const haversineOfKm = (km: number) => sinSquared(Math.min(Math.PI, (Math.max(0, km) * 1000) / EARTH_RADIUS_M))

/** sin² of half the angle between two meridians; whole turns do not matter. */
const meridians = (a: number, b: number) => sinSquared((a - b) * RADIANS)

interface Centre {
  lat: number
  lng: number
  sinLat: number
  cosLat: number
}

/** Haversines from the centre to the nearest and to the farthest point of a box. */
function reach(centre: Centre, box: WorldBox): { least: number; most: number } {
  const south = sinSquared((box.south - centre.lat) * RADIANS)
  const north = sinSquared((box.north - centre.lat) * RADIANS)
  const southWide = centre.cosLat * Math.cos(box.south * RADIANS)
  const northWide = centre.cosLat * Math.cos(box.north * RADIANS)
  const west = meridians(centre.lng, box.west)
  const east = meridians(centre.lng, box.east)
  const far = Math.max(west, east)
  // Beyond a quarter turn the corners do not tell; then nothing is taken or left out whole.
  const most =
    far > 0.5 || box.east - box.west > 90
      ? Infinity
      : Math.max(south + southWide * far, north + northWide * far)
  if (centre.lng >= box.west && centre.lng <= box.east) {
    return { least: centre.lat < box.south ? south : centre.lat > box.north ? north : 0, most }
  }
  const near = Math.min(west, east)
  const atEnds = Math.min(south + southWide * near, north + northWide * near)
  // Elsewhere on the nearer meridian only the foot of the great circle that meets it at a right angle can be nearer
  // (Napier's rules: tan of its latitude is tan(lat) / cos(apart)); it lies poleward of the centre.
  const poleward = centre.lat >= 0 ? box.north > centre.lat : box.south < centre.lat
  if (!poleward) return { least: atEnds, most }
  const foot = Math.atan2(centre.sinLat, centre.cosLat * (1 - 2 * near)) / RADIANS
  if (foot <= box.south || foot >= box.north) return { least: atEnds, most }
  const atFoot = sinSquared((foot - centre.lat) * RADIANS) + centre.cosLat * Math.cos(foot * RADIANS) * near
  return { least: Math.min(atEnds, atFoot), most }
}

/**
 * Hilbert ranges that hold every point of the ring, about a fifth more ground than the ring itself.
 * `mostQuads` bounds the squares looked at; neighbours are merged, so there are fewer ranges.
 */
export function circleCover({ centre, radiusKm, beyondKm = 0 }: Ring, mostQuads = 48): HilbertRange[] {
  const { lat, lng } = centre
  const at = { lat, lng, sinLat: Math.sin(lat * RADIANS), cosLat: Math.cos(lat * RADIANS) }
  const outer = haversineOfKm(radiusKm + MARGIN_KM)
  const whole = haversineOfKm(radiusKm - MARGIN_KM)
  const inner = beyondKm > MARGIN_KM ? haversineOfKm(beyondKm - MARGIN_KM) : -1
  return hilbertCover((box) => {
    const { least, most } = reach(at, box)
    if (least > outer || most < inner) return 'out'
    return most <= whole && least >= inner ? 'in' : 'edge'
  }, mostQuads)
}
