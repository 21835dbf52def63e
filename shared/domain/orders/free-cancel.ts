import { clockMs } from '@/shared/domain/orders/clocks.facts'

const hourMs = 3_600_000

export interface CancelFacts {
  /** Start of the slot or ship day; null while no day is agreed. Times in ms since 1970. */
  slotStartMs: number | null
  category: string
  /** The listing's own free time; the house default of the category when null. */
  freeCancelHours: number | null
  /** When the order's quantity was last cut by the seller; null when never. */
  quantityCutMs: number | null
  /** Whether the seller moved the day by their own press: a day that the buyer never chose binds nobody. */
  isMovedBySeller: boolean
}

/** Until when a buyer may cancel for a full refund, ms. null: no day is agreed yet, so always. */
export function freeCancelUntilMs(facts: CancelFacts): number | null {
  const { slotStartMs, category, freeCancelHours, quantityCutMs, isMovedBySeller } = facts
  if (slotStartMs === null) return null
  if (isMovedBySeller) return slotStartMs
  const freeMs = freeCancelHours === null ? clockMs('freeCancel', category) : freeCancelHours * hourMs
  const afterCutMs =
    quantityCutMs === null ? -Infinity : quantityCutMs + clockMs('quantityCutCancel', category)
  return Math.max(slotStartMs - freeMs, afterCutMs)
}

/** Whether cancelling at this moment costs the buyer nothing. */
export function isFreeCancel(facts: CancelFacts, nowMs: number): boolean {
  const untilMs = freeCancelUntilMs(facts)
  return untilMs === null || nowMs <= untilMs
}
