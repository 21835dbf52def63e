import { earthPoint, kmOfSquaredChord, squaredChord } from '@/shared/domain/geo/earth-point'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

/**
 * km over a sphere, the same figure that search sorts and filters by. Against the ellipsoid it errs by up to about
 * 0.5 % (from memory), less than the cells that both ends stand for.
 */
export function distanceKm(from: CellPoint, to: CellPoint): number {
  return kmOfSquaredChord(squaredChord(earthPoint(from), earthPoint(to)))
}
