import type { Tx } from '@/db/transaction'
import type { OrderRow } from '@/server/orders/order-store'
import { insertSurvival } from '@/server/ratings/survival-store'
import { ratingTimes } from '@/shared/domain/ratings/rating-times.facts'

/** Begins the seven days, in the transaction of the hand-over. */
export async function openSurvival(tx: Tx, order: OrderRow): Promise<void> {
  if (!order.handedOverAt) throw new Error(`order ${order.id} was not handed over`)
  await insertSurvival(tx, {
    orderId: order.id,
    sellerId: order.sellerId,
    handedOver: order.countHandedOver ?? order.quantity,
    dueAt: new Date(order.handedOverAt.getTime() + ratingTimes.survivalAskedMs),
  })
}
