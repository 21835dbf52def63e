/** Below this total, two charges cost more than they protect. House rule (orders under $40). */
export const SMALL_TOTAL_CENTS = 4000
const SEVEN_DAYS_MS = 7 * 24 * 3600 * 1000

/** May the buyer pay everything at once? When the total is small or the slot is within seven days. Times in ms. */
export function mayPayInFull(order: {
  totalCents: number
  nowMs: number
  slotStartMs: number | null
}): boolean {
  if (order.totalCents < SMALL_TOTAL_CENTS) return true
  return order.slotStartMs !== null && order.slotStartMs - order.nowMs <= SEVEN_DAYS_MS
}
