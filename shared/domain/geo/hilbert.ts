import type { CellPoint } from '@/shared/domain/geo/location-cell'

/** Steps of each side of the world box: 2^16 columns of longitude, 2^16 rows of latitude. */
export const HILBERT_BITS = 16
const SIDE = 2 ** HILBERT_BITS

/**
 * Place of column `ix`, row `iy` along a Hilbert curve over 2^bits × 2^bits squares. A prefix of 2·L bits is a
 * quadtree square of level L. Hilbert 1891, Math. Ann. 38:459-460 (the curve; the bit loop is the usual one).
 */
export function hilbertIndex(ix: number, iy: number, bits = HILBERT_BITS): number {
  let x = ix
  let y = iy
  let index = 0
  for (let half = 1 << (bits - 1); half > 0; half >>= 1) {
    const right = x & half ? 1 : 0
    const upper = y & half ? 1 : 0
    // Not a shift: the last steps fill the 32nd bit.
    index = index * 4 + ((3 * right) ^ upper)
    x &= half - 1
    y &= half - 1
    if (!upper) {
      const turned = right ? half - 1 - y : y
      y = right ? half - 1 - x : x
      x = turned
    }
  }
  return index
}

/** Column and row of a place along the curve; the inverse of `hilbertIndex`. */
export function hilbertSquare(index: number, bits = HILBERT_BITS): { ix: number; iy: number } {
  let x = 0
  let y = 0
  let rest = index
  for (let side = 1; side < 2 ** bits; side *= 2) {
    const quarter = rest % 4
    rest = Math.floor(rest / 4)
    const right = quarter >> 1
    const upper = (quarter ^ right) & 1
    if (!upper) {
      const turned = right ? side - 1 - y : y
      y = right ? side - 1 - x : x
      x = turned
    }
    x += right * side
    y += upper * side
  }
  return { ix: x, iy: y }
}

/** Degrees → place along the curve, 0 to 2^32 - 1. 180° E is 180° W. */
export function hilbertOfPoint({ lat, lng }: CellPoint): number {
  const ix = Math.floor(((lng + 180) / 360) * SIDE) & (SIDE - 1)
  const iy = Math.min(SIDE - 1, Math.floor(((lat + 90) / 180) * SIDE))
  return hilbertIndex(ix, iy)
}

/** Middle of the square of level `bits` with that index, degrees. */
export function hilbertCentre(index: number, bits = HILBERT_BITS): CellPoint {
  const { ix, iy } = hilbertSquare(index, bits)
  const side = 2 ** bits
  return { lat: ((iy + 0.5) / side) * 180 - 90, lng: ((ix + 0.5) / side) * 360 - 180 }
}
