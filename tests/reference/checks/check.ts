/** One published or worked figure against the product's own function. */
export interface Check {
  what: string
  published: number
  ours: () => number | null
  /** Absolute, in the unit of the figure, with its reason. */
  within: number
  because: string
  from: string
}

interface Lot {
  from: string
  because: string
  within: number
}

/** Several figures of one table: same source, tolerance and reason. */
export function checksOf<Key extends string | number>(
  lot: Lot,
  rows: readonly (readonly [what: string, key: Key, published: number])[],
  ours: (key: Key) => number | null,
): Check[] {
  return rows.map(([what, key, published]) => ({ what, published, ours: () => ours(key), ...lot }))
}

/** Distance between the published figure and ours; infinite where we do not answer. */
export function errorOf({ published, ours }: Check): number {
  const answer = ours()
  return answer === null || !Number.isFinite(answer) ? Infinity : Math.abs(answer - published)
}
