import { CELL_DEG } from '@/shared/domain/season/cell-size'
import { valueOf } from '@/shared/domain/season/season-code'
import { bandRows } from '@/shared/domain/season/season-table.gen'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

/** A degree of latitude is 110.57 km at the equator and longer elsewhere (WGS 84): the shortest gives the widest box. */
const KM_PER_DEGREE = 110.5
const RADIANS = Math.PI / 180

/** Every climate band of the box around a circle, km: all that `seasonBandAt` gives inside the circle, and a few more. */
export function seasonBandsWithin({ lat, lng }: CellPoint, radiusKm: number): ReadonlySet<number> {
  const high = radiusKm / KM_PER_DEGREE
  const poleward = Math.min(89.9, Math.abs(lat) + high)
  const wide = Math.min(360, high / Math.cos(poleward * RADIANS))
  const cell = (degrees: number) => Math.floor(degrees / CELL_DEG)
  const [south, north, west, east] = [lat - high, lat + high, lng - wide, lng + wide].map(cell) as [
    number,
    number,
    number,
    number,
  ]
  const bands = new Set<number>()
  for (const [row, first, codes] of bandRows) {
    if (row < south || row > north) continue
    const last = Math.min(codes.length - 1, east - first)
    for (let at = Math.max(0, west - first); at <= last; at++) {
      const band = valueOf(codes, at)
      if (band !== null) bands.add(band)
    }
  }
  return bands
}
