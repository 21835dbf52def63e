import type { Shape } from '@/tests/bench/make-query'
import type { ShapeResult } from '@/tests/bench/run-shape'

// Rows read for a page on average, by number of listings; measured with seed 42, and half as much again.
const BUDGETS: Record<number, Record<Shape, number>> = {
  10_000: { A: 29, B: 330, C: 24, D: 188, E: 216, F: 252, G: 80, H: 32 },
}

/** Shapes that read more rows than they used to. Other sizes have no budget. */
export function rowFaults(listings: number, results: readonly ShapeResult[]): string[] {
  const budget = BUDGETS[listings]
  if (!budget) return []
  return results
    .filter(({ shape, meanRowsRead }) => meanRowsRead > budget[shape])
    .map(
      ({ shape, meanRowsRead }) =>
        `${shape} reads ${meanRowsRead.toFixed(0)} rows a page, budget ${budget[shape]}`,
    )
}
