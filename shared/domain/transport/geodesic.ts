import type { Equation } from '@/shared/domain/equation'
import { EARTH_RADIUS_M } from '@/shared/domain/geo/earth-point'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { integrate } from '@/shared/domain/transport/gauss-legendre'

export const geodesicEquation: Equation = {
  text: 'shortest line on the WGS 84 ellipsoid: the azimuth whose longitude meets the target, by bisection, its length by quadrature',
  validFor: 'every pair of points, opposite ends of the Earth too',
  sourceKeys: ['karney-2013'],
}

const RADIANS = Math.PI / 180
const A = 6_378_137
const F = 1 / 298.257223563
const B = A * (1 - F)
const SECOND_ECCENTRICITY2 = (F * (2 - F)) / (1 - F) ** 2
const BISECTIONS = 64

interface ReducedPoint {
  sin: number
  cos: number
}

/** Latitude on the auxiliary sphere. */
function reduced(lat: number): ReducedPoint {
  const [sin, cos] = [(1 - F) * Math.sin(lat * RADIANS), Math.cos(lat * RADIANS)]
  const length = Math.hypot(sin, cos)
  return { sin: sin / length, cos: Math.max(cos / length, 1e-16) }
}

const isOnEarth = ({ lat, lng }: CellPoint) => Math.abs(lat) <= 90 && Math.abs(lng) <= 180

/** Metres along the ground on the WGS 84 ellipsoid. null: not two places on Earth. */
export function geodesicM(from: CellPoint, to: CellPoint): number | null {
  if (!isOnEarth(from) || !isOnEarth(to)) return null
  const turn = Math.abs(to.lng - from.lng) % 360
  const target = (turn > 180 ? 360 - turn : turn) * RADIANS
  // As in the source: start at the point farther from the equator, on the southern side; the mirror changes nothing.
  const [far, near] = Math.abs(from.lat) >= Math.abs(to.lat) ? [from, to] : [to, from]
  const side = far.lat > 0 ? -1 : 1
  if (far.lat === 0 && target <= (1 - F) * Math.PI) return A * target
  const start = reduced(far.lat === 0 ? -1e-13 : side * far.lat)
  const end = reduced(side * near.lat)
  let [low, high] = [0, Math.PI]
  for (let pass = 0; pass < BISECTIONS; pass++) {
    const middle = (low + high) / 2
    if (lineOf(start, end, middle).longitude < target) low = middle
    else high = middle
  }
  return lineOf(start, end, (low + high) / 2).metres
}

/** Where the line that leaves `start` at this azimuth meets the parallel of `end`: names as in the source. */
function lineOf(start: ReducedPoint, end: ReducedPoint, azimuth: number) {
  const [sinAlpha1, cosAlpha1] = [Math.sin(azimuth), Math.cos(azimuth)]
  const sinAlpha0 = sinAlpha1 * start.cos
  const cosAlpha0 = Math.hypot(cosAlpha1, sinAlpha1 * start.sin)
  const widening = (start.sin - end.sin) * (start.sin + end.sin)
  const cosAlpha2 = Math.sqrt(Math.max(0, (cosAlpha1 * start.cos) ** 2 + widening)) / end.cos
  const sigma1 = Math.atan2(start.sin, cosAlpha1 * start.cos)
  const sigma2 = Math.atan2(end.sin, cosAlpha2 * end.cos)
  const omega = (sigma: number) => Math.atan2(sinAlpha0 * Math.sin(sigma), Math.cos(sigma))
  const k2 = SECOND_ECCENTRICITY2 * cosAlpha0 ** 2
  const stretch = (sigma: number) => Math.sqrt(1 + k2 * Math.sin(sigma) ** 2)
  const lag = integrate((sigma) => (2 - F) / (1 + (1 - F) * stretch(sigma)), sigma1, sigma2)
  return {
    longitude: omega(sigma2) - omega(sigma1) - F * sinAlpha0 * lag,
    metres: B * integrate(stretch, sigma1, sigma2),
  }
}

/** Metres along the ground on the sphere that search measures by, unrounded. null: not two places on Earth. */
export function sphereM(from: CellPoint, to: CellPoint): number | null {
  if (!isOnEarth(from) || !isOnEarth(to)) return null
  const half = (degrees: number) => Math.sin((degrees * RADIANS) / 2) ** 2
  const haversine =
    half(to.lat - from.lat) +
    Math.cos(from.lat * RADIANS) * Math.cos(to.lat * RADIANS) * half(to.lng - from.lng)
  return 2 * EARTH_RADIUS_M * Math.asin(Math.min(1, Math.sqrt(haversine)))
}
