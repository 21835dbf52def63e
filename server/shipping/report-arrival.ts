import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { changeShipment } from '@/server/orders/shipment-store'
import { showAgain } from '@/server/orders/show-order'
import { openSurvival } from '@/server/ratings/open-survival'
import { orderShippedFor } from '@/server/shipping/order-shipped'
import type { ShownOrder } from '@/shared/contracts/orders'

/** E35: the buyer has the box. The claim window and the seven days of the survival question begin. */
export async function reportArrival(caller: Caller, orderId: string, commandId: string): Promise<ShownOrder> {
  const shipped = await orderShippedFor('buyer', caller, orderId)
  await inTransaction(async (tx) => {
    const at = now()
    const { order, applied } = await applyEdge(tx, {
      edge: 'E35',
      orderId: shipped.order.id,
      commandId,
      actor: 'buyer',
      actorId: caller.memberId,
      change: { handedOverAt: at },
    })
    if (!applied) return
    await changeShipment(tx, order.id, { arrivedAt: at })
    await openSurvival(tx, order)
  })
  return showAgain(shipped)
}
