import geographiclib from 'geographiclib-geodesic'

import type { Equation } from '@/shared/domain/equation'
import { EARTH_RADIUS_M } from '@/shared/domain/geo/earth-point'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

export const geodesicEquation: Equation = {
  text: 'shortest line on the WGS 84 ellipsoid: the inverse geodesic problem as solved by GeographicLib',
  validFor: 'every pair of points, opposite ends of the Earth too',
  sourceKeys: ['karney-2013'],
}

const RADIANS = Math.PI / 180

const isOnEarth = ({ lat, lng }: CellPoint) => Math.abs(lat) <= 90 && Math.abs(lng) <= 180

/** Metres along the ground on the WGS 84 ellipsoid. null: not two places on Earth. */
export function geodesicM(from: CellPoint, to: CellPoint): number | null {
  if (!isOnEarth(from) || !isOnEarth(to)) return null
  return geographiclib.Geodesic.WGS84.Inverse(from.lat, from.lng, to.lat, to.lng).s12 ?? null
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
