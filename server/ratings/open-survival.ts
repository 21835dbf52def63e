import type { Tx } from '@/db/transaction'
import type { OrderRow } from '@/server/orders/order-store'
import { insertSurvival } from '@/server/ratings/survival-store'
import { ratingTimes } from '@/shared/domain/ratings/rating-times.facts'

/**
 * Begins the seven days, in the transaction of the hand-over. Of fish alone: worms are sold by packs that nobody counts
 * again, and what is eaten does not survive.
 */
export async function openSurvival(tx: Tx, order: OrderRow): Promise<void> {
  if (order.category !== 'fish') return
  if (!order.handedOverAt) throw new Error(`order ${order.id} was not handed over`)
  await insertSurvival(tx, {
    orderId: order.id,
    sellerId: order.sellerId,
    handedOver: order.countHandedOver ?? order.quantity,
    dueAt: new Date(order.handedOverAt.getTime() + ratingTimes.survivalAskedMs),
  })
}
