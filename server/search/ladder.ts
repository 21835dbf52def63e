export interface RungCount {
  categoryCode: number
  /** Day or rating rank. */
  rung: number
  count: number
}

/** How many listings stand on which rung of an index, by category. Only sizes walks; may be minutes old. */
export class Ladder {
  private readonly rungs = new Map<number, { rung: number; below: number }[]>()

  constructor(counts: readonly RungCount[]) {
    for (const { categoryCode, rung, count } of [...counts].sort((a, b) => a.rung - b.rung)) {
      const own = this.rungs.get(categoryCode) ?? []
      own.push({ rung, below: (own[own.length - 1]?.below ?? 0) + count })
      this.rungs.set(categoryCode, own)
    }
  }

  /** Listings of these categories on this rung and below. */
  upTo(categories: readonly number[], rung: number): number {
    return categories.reduce((sum, category) => sum + this.upToIn(category, rung), 0)
  }

  /** The lowest rung up to which so many stand; null: there are not so many. */
  reaching(categories: readonly number[], count: number): number | null {
    const steps = [
      ...new Set(categories.flatMap((category) => (this.rungs.get(category) ?? []).map(({ rung }) => rung))),
    ]
    steps.sort((a, b) => a - b)
    let low = 0
    let high = steps.length
    while (low < high) {
      const middle = (low + high) >> 1
      if (this.upTo(categories, steps[middle] ?? 0) >= count) high = middle
      else low = middle + 1
    }
    return steps[low] ?? null
  }

  private upToIn(category: number, rung: number): number {
    const own = this.rungs.get(category) ?? []
    let low = 0
    let high = own.length
    while (low < high) {
      const middle = (low + high) >> 1
      if ((own[middle]?.rung ?? 0) <= rung) low = middle + 1
      else high = middle
    }
    return own[low - 1]?.below ?? 0
  }
}
