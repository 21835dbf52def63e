import { quoteTotals, type OrderTotals } from '@/shared/domain/money/quote-order'

export interface PooledOrder {
  quantity: number
  /** The tier the run reached when it closed. */
  unitCents: number
  boxCents: number
  freightCents: number
  taxCents: number
  feeBp: number
  /** Captured at the dearest tier when the member joined; it stays. */
  depositPaidCents: number
}

/**
 * A member's totals once the run has closed: the deposit stays, the balance shrinks with the price. What the deposit
 * exceeds the new total by goes back.
 */
export function requotePool(order: PooledOrder): OrderTotals & { refundCents: number } {
  const { depositPaidCents } = order
  const totals = quoteTotals(order.unitCents * order.quantity, { ...order, depositBp: 0 })
  const depositCents = Math.min(depositPaidCents, totals.totalCents)
  return {
    ...totals,
    depositCents,
    balanceCents: totals.totalCents - depositCents,
    refundCents: depositPaidCents - depositCents,
  }
}
