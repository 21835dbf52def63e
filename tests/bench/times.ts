export interface Times {
  samples: number
  p50Ms: number
  p95Ms: number
}

const at = (sorted: readonly number[], share: number) =>
  sorted[Math.min(sorted.length - 1, Math.floor(sorted.length * share))] ?? NaN

/** Median and 95th percentile. */
export function timesOf(ms: readonly number[]): Times {
  const sorted = [...ms].sort((a, b) => a - b)
  return { samples: sorted.length, p50Ms: at(sorted, 0.5), p95Ms: at(sorted, 0.95) }
}
