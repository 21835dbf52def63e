import type { Shape } from '@/tests/bench/make-query'
import type { ShapeResult } from '@/tests/bench/run-shape'

// Rows read for a page on average, by number of listings; measured with seed 42, and half as much again.
const BUDGETS: Record<number, Record<Shape, number>> = {
  10_000: { A: 27, B: 335, C: 23, D: 189, E: 216, F: 248, G: 81, H: 47 },
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
