/** Seeded chance: the same seed gives the same listings and questions on every machine. */
export interface Chances {
  /** 0 ≤ x < 1 */
  next: () => number
  /** Whole number, both ends included. */
  between: (least: number, most: number) => number
  /** Mean 0, deviation 1. */
  normal: () => number
  lognormal: (sigma: number) => number
  yes: (share: number) => boolean
  pick: <T>(from: readonly T[]) => T
}

/** mulberry32 */
export function chances(seed: number): Chances {
  let state = seed | 0
  const next = () => {
    state = (state + 0x6d2b79f5) | 0
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state)
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296
  }
  // Box and Muller 1958
  const normal = () => Math.sqrt(-2 * Math.log(1 - next())) * Math.cos(2 * Math.PI * next())
  const between = (least: number, most: number) => least + Math.floor(next() * (most - least + 1))
  return {
    next,
    between,
    normal,
    lognormal: (sigma) => Math.exp(sigma * normal()),
    yes: (share) => next() < share,
    pick: (from) => {
      const picked = from[between(0, from.length - 1)]
      if (picked === undefined) throw new RangeError('nothing to pick from')
      return picked
    },
  }
}

/** Draws an index in proportion to its weight. */
export function weighted(weights: readonly number[], { next }: Chances): () => number {
  const sums: number[] = []
  let total = 0
  for (const weight of weights) sums.push((total += weight))
  return () => {
    const at = next() * total
    let low = 0
    let high = sums.length - 1
    while (low < high) {
      const middle = (low + high) >> 1
      if ((sums[middle] ?? 0) > at) high = middle
      else low = middle + 1
    }
    return low
  }
}
