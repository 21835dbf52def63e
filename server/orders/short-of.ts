import { Problem } from '@/shared/api/problem'

/** Somebody was faster: how many are left now. */
export function shortOf(left: number): Problem {
  return new Problem('batch-short', `Just taken: ${left} left.`, { facts: { left } })
}
