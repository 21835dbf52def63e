import type { SourceKey } from '@/shared/sources'
import type { ReasonCode } from '@/shared/domain/transport/reason-texts.facts'

export type Verdict = 'safe' | 'caution' | 'unknown' | 'unsafe'

/** One thing that speaks for or against a trip. `safe` reasons are remarks. */
export interface Reason {
  code: ReasonCode
  verdict: Verdict
  /** What the trip comes to, and the limit it is held against; in the unit the code names. */
  value: number | null
  limit: number | null
  /** Hours after packing at which it first holds. null: the whole trip. */
  atHour: number | null
  sourceKey: SourceKey
}

const order: readonly Verdict[] = ['safe', 'caution', 'unknown', 'unsafe']

/** 0 for safe … 3 for unsafe: what is known to kill outweighs what nobody knows. */
export const rankOf = (verdict: Verdict) => order.indexOf(verdict)

/** The strictest of all reasons. No reason at all is safe. */
export function strictest(reasons: readonly Reason[]): Verdict {
  return reasons.reduce<Verdict>(
    (worst, { verdict }) => (rankOf(verdict) > rankOf(worst) ? verdict : worst),
    'safe',
  )
}
