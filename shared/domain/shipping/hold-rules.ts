import { clockMs } from '@/shared/domain/orders/clocks.facts'

export interface HoldFacts {
  /** 1 for the first hold of the order. */
  number: number
  /** Begin of the day or window agreed before the hold, ms since 1970. */
  fromMs: number
  /** Begin of the proposed one; null: open-ended. */
  proposedMs: number | null
  /** When the hold began. */
  heldMs: number
}

/**
 * Whether a buyer's silence may move the day (16 CFR 435.2(b)): only for the first hold, only to a named day, and only
 * up to 30 days after the one agreed before. Otherwise silence ends the order and all money goes back.
 */
export function silenceMoves({ number, fromMs, proposedMs, heldMs }: HoldFacts): boolean {
  if (number !== 1 || proposedMs === null) return false
  // The time to answer has to be over before the day begins.
  if (proposedMs < heldMs + clockMs('weatherConsent', 'fish')) return false
  return proposedMs - fromMs <= clockMs('weatherSilence', 'fish')
}
