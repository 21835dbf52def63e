import type { CellPoint } from '@/shared/domain/geo/location-cell'

/** Mean radius of the Earth, IUGG: (2a + b) / 3 of the GRS 80 ellipsoid, in metres. */
export const EARTH_RADIUS_M = 6_371_008.8
const RADIUS_DM = EARTH_RADIUS_M * 10
const RADIANS = Math.PI / 180

/** Decimetres from the Earth's centre, whole numbers: x towards 0° N 0° E, y towards 0° N 90° E, z north. */
export interface EarthPoint {
  x: number
  y: number
  z: number
}

/** Degrees → the nearest whole decimetre on the sphere. No pole and no date line: both are ordinary points. */
export function earthPoint({ lat, lng }: CellPoint): EarthPoint {
  const aside = Math.cos(lat * RADIANS) * RADIUS_DM
  return {
    x: Math.round(aside * Math.cos(lng * RADIANS)),
    y: Math.round(aside * Math.sin(lng * RADIANS)),
    z: Math.round(Math.sin(lat * RADIANS) * RADIUS_DM),
  }
}

/** Square of the straight line through the Earth, dm²: sorts like the distance. Exact up to 9,000 km. */
export function squaredChord(a: EarthPoint, b: EarthPoint): number {
  return (a.x - b.x) ** 2 + (a.y - b.y) ** 2 + (a.z - b.z) ** 2
}

/** dm² of chord → km over the ground (0 to 20,015). */
export function kmOfSquaredChord(dm2: number): number {
  return (2 * EARTH_RADIUS_M * Math.asin(Math.min(1, Math.sqrt(dm2) / (2 * RADIUS_DM)))) / 1000
}

/** km over the ground → whole dm² of chord, rounded down; half the Earth's girth and more is the diameter. */
export function squaredChordOfKm(km: number): number {
  const angle = Math.min(Math.PI, Math.max(0, (km * 1000) / EARTH_RADIUS_M))
  return Math.floor((2 * RADIUS_DM * Math.sin(angle / 2)) ** 2)
}
