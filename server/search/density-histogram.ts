import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { hilbertSquare } from '@/shared/domain/geo/hilbert'

const KM_PER_DEGREE = 111.195
const RADIANS = Math.PI / 180
/** Finest level kept, squares of 0.18 by 0.09 degrees: fine enough to size a circle of 25 km. */
export const FINEST_LEVEL = 11
const COARSEST_LEVEL = 3
/** A circle is summed on the finest level that has at most so many squares across it. */
const MOST_ACROSS = 7

export interface DensityCell {
  categoryCode: number
  speciesCode: number
  /** Prefix of the Hilbert index, `FINEST_LEVEL` deep. */
  cell: number
  count: number
}

/** Listings a square, for each level; a square's key is row × 2^16 + column. */
type Pyramid = Map<number, number>[]

export interface DensityClass {
  categoryCode?: number
  speciesCode?: number
}

const squareKey = (ix: number, iy: number) => iy * 65_536 + ix

function add(pyramid: Pyramid, cell: number, count: number): void {
  const { ix, iy } = hilbertSquare(cell, FINEST_LEVEL)
  for (let level = COARSEST_LEVEL; level <= FINEST_LEVEL; level++) {
    const shift = FINEST_LEVEL - level
    const squares = (pyramid[level] ??= new Map())
    const key = squareKey(ix >> shift, iy >> shift)
    squares.set(key, (squares.get(key) ?? 0) + count)
  }
}

/** Kilometres east and north. */
interface Offset {
  x: number
  y: number
}

/** Share of a square inside a circle, from 16 points of it; the ground is taken as flat, as this only sizes plans. */
function shareInside(off: Offset, half: Offset, radiusKm: number): number {
  const corner = Math.hypot(half.x, half.y)
  const away = Math.hypot(off.x, off.y)
  if (away + corner <= radiusKm) return 1
  if (away - corner > radiusKm) return 0
  let inside = 0
  for (const px of [-0.75, -0.25, 0.25, 0.75]) {
    for (const py of [-0.75, -0.25, 0.25, 0.75]) {
      if (Math.hypot(off.x + px * half.x, off.y + py * half.y) <= radiusKm) inside++
    }
  }
  return inside / 16
}

/**
 * How many listings stand where: sizes the first circle of a search. May be minutes old; a wrong figure costs a
 * round trip, never a wrong answer.
 */
export class DensityHistogram {
  private readonly pyramids = new Map<string, Pyramid>()
  private readonly totals = new Map<string, number>()
  private readonly categories = new Map<number, number>()

  constructor(cells: Iterable<DensityCell>) {
    for (const { categoryCode, speciesCode, cell, count } of cells) {
      if (speciesCode > 0) this.categories.set(speciesCode, categoryCode)
      for (const name of ['all', `c${categoryCode}`, `s${speciesCode}`]) {
        let pyramid = this.pyramids.get(name)
        if (!pyramid) this.pyramids.set(name, (pyramid = []))
        add(pyramid, cell, count)
        this.totals.set(name, (this.totals.get(name) ?? 0) + count)
      }
    }
  }

  private static nameOf({ categoryCode, speciesCode }: DensityClass): string {
    if (speciesCode !== undefined) return `s${speciesCode}`
    return categoryCode === undefined ? 'all' : `c${categoryCode}`
  }

  /** null: the species was nowhere at the last count. */
  categoryOf(speciesCode: number): number | null {
    return this.categories.get(speciesCode) ?? null
  }

  total(of: DensityClass): number {
    return this.totals.get(DensityHistogram.nameOf(of)) ?? 0
  }

  /** About how many listings of the class stand within the circle. */
  within(of: DensityClass, centre: CellPoint, radiusKm: number): number {
    const pyramid = this.pyramids.get(DensityHistogram.nameOf(of))
    if (!pyramid) return 0
    const highKm = 180 * KM_PER_DEGREE
    const wanted = Math.floor(Math.log2((MOST_ACROSS * highKm) / (2 * radiusKm)))
    const level = Math.min(FINEST_LEVEL, Math.max(COARSEST_LEVEL, wanted))
    return sumCircle(pyramid[level] ?? new Map(), level, { centre, radiusKm })
  }
}

function sumCircle(
  squares: Map<number, number>,
  level: number,
  circle: { centre: CellPoint; radiusKm: number },
) {
  const { centre, radiusKm } = circle
  const side = 2 ** level
  const high = 180 / side
  const wide = 360 / side
  const kmPerLng = KM_PER_DEGREE * Math.max(0.05, Math.cos(centre.lat * RADIANS))
  const half = { x: (wide * kmPerLng) / 2, y: (high * KM_PER_DEGREE) / 2 }
  const column = (lng: number) => Math.floor((lng + 180) / wide)
  const row = (lat: number) => Math.min(side - 1, Math.max(0, Math.floor((lat + 90) / high)))
  const reachLat = radiusKm / KM_PER_DEGREE
  const reachLng = Math.min(180, radiusKm / kmPerLng)
  const firstColumn = column(centre.lng - reachLng)
  const lastColumn = Math.min(column(centre.lng + reachLng), firstColumn + side - 1)
  let sum = 0
  for (let iy = row(centre.lat - reachLat); iy <= row(centre.lat + reachLat); iy++) {
    const offY = ((iy + 0.5) * high - 90 - centre.lat) * KM_PER_DEGREE
    for (let ix = firstColumn; ix <= lastColumn; ix++) {
      const count = squares.get(squareKey(((ix % side) + side) % side, iy))
      if (!count) continue
      const offX = ((ix + 0.5) * wide - 180 - centre.lng) * kmPerLng
      sum += count * shareInside({ x: offX, y: offY }, half, radiusKm)
    }
  }
  return sum
}
