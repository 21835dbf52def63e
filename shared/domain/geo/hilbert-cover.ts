import { HILBERT_BITS, hilbertIndex } from '@/shared/domain/geo/hilbert'

/** Places along the Hilbert curve, both ends included. */
export interface HilbertRange {
  from: number
  to: number
}

/** A square of the quadtree over the world, degrees. */
export interface WorldBox {
  south: number
  north: number
  west: number
  east: number
}

/** `out`: leave it away. `in`: take it whole. `edge`: look closer if there is room. */
export type BoxVerdict = 'out' | 'in' | 'edge'

interface Quad {
  level: number
  ix: number
  iy: number
}

function boxOf({ level, ix, iy }: Quad): WorldBox {
  const wide = 360 / 2 ** level
  const high = 180 / 2 ** level
  const west = ix * wide - 180
  const south = iy * high - 90
  return { west, east: west + wide, south, north: south + high }
}

const quarters = ({ level, ix, iy }: Quad): Quad[] =>
  [0, 1, 2, 3].map((part) => ({ level: level + 1, ix: ix * 2 + (part & 1), iy: iy * 2 + (part >> 1) }))

function rangeOf({ level, ix, iy }: Quad): HilbertRange {
  const size = 4 ** (HILBERT_BITS - level)
  const from = level === 0 ? 0 : hilbertIndex(ix, iy, level) * size
  return { from, to: from + size - 1 }
}

function merged(ranges: HilbertRange[]): HilbertRange[] {
  const sorted = ranges.sort((a, b) => a.from - b.from)
  const joined: HilbertRange[] = []
  for (const range of sorted) {
    const last = joined[joined.length - 1]
    if (last && last.to + 1 === range.from) last.to = range.to
    else joined.push({ ...range })
  }
  return joined
}

/**
 * Few ranges that hold every square `judge` does not call `out`: the largest edge square is split until about
 * `mostQuads` squares are left. May hold more than asked for, never less.
 */
export function hilbertCover(judge: (box: WorldBox) => BoxVerdict, mostQuads = 48): HilbertRange[] {
  const whole: Quad[] = []
  // Breadth first: the front of the queue is never smaller than what stands behind it.
  const edge: Quad[] = [{ level: 0, ix: 0, iy: 0 }]
  let front = 0
  while (front < edge.length && whole.length + edge.length - front < mostQuads) {
    const largest = edge[front]
    if (!largest || largest.level === HILBERT_BITS) break
    front++
    for (const quarter of quarters(largest)) {
      const verdict = judge(boxOf(quarter))
      if (verdict === 'in') whole.push(quarter)
      else if (verdict === 'edge') edge.push(quarter)
    }
  }
  return merged([...whole, ...edge.slice(front)].map(rangeOf))
}
