import type { OrderRow } from '@/server/orders/order-store'
import type { ListingBody } from '@/shared/contracts/listings'
import { freeCancelUntilMs } from '@/shared/domain/orders/free-cancel'

/** Until when the buyer may cancel for nothing; null while that is always so (no day is agreed yet). */
export function freeCancelUntil(order: OrderRow, terms: ListingBody): Date | null {
  const isAgreed = order.state !== 'deposit_paid'
  const untilMs = freeCancelUntilMs({
    slotStartMs: isAgreed ? (order.slotStartsAt?.getTime() ?? null) : null,
    category: terms.category,
    freeCancelHours: terms.freeCancelHours,
    quantityCutMs: order.quantityCutAt?.getTime() ?? null,
    // A day that came by silence was no choice of the buyer's either.
    isMovedBySeller: order.sellerMoves > 0 || order.isDayBySilence,
  })
  return untilMs === null ? null : new Date(untilMs)
}
