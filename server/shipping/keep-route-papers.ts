import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { mayAct } from '@/server/orders/order-policy'
import { lockOrder } from '@/server/orders/order-store'
import { changeShipment } from '@/server/orders/shipment-store'
import { showAgain } from '@/server/orders/show-order'
import { orderShippedFor } from '@/server/shipping/order-shipped'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { RoutePaper } from '@/shared/contracts/shipments'

/** The seller names the papers that travel with the animals; the list as given takes the place of the one before. */
export async function keepRoutePapers(
  caller: Caller,
  orderId: string,
  papers: RoutePaper[],
): Promise<ShownOrder> {
  const shipped = await orderShippedFor('seller', caller, orderId)
  await inTransaction(async (tx) => {
    const order = await lockOrder(tx, shipped.order.id)
    if (!order || !mayAct('name-papers', order, 'seller')) {
      throw new Problem('order-moved', undefined, { facts: { state: order?.state ?? '' } })
    }
    await changeShipment(tx, order.id, { papers })
  })
  return showAgain(shipped)
}
