import type { Caller } from '@/server/http/caller'
import { orderSeenBy, type OrderSeen } from '@/server/orders/party-of'
import { presentOrders } from '@/server/orders/present-order'
import { readOrderById } from '@/server/orders/order-store'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

export async function showOrder(caller: Caller, orderId: string): Promise<ShownOrder> {
  return presentOne(await orderSeenBy(caller, orderId))
}

/** The order as it stands now, after an act of its viewer. */
export async function showAgain(seen: OrderSeen): Promise<ShownOrder> {
  const order = await readOrderById(seen.order.id)
  if (!order) throw new Problem('not-found')
  return presentOne({ order, party: seen.party })
}

async function presentOne(seen: OrderSeen): Promise<ShownOrder> {
  const [shown] = await presentOrders([seen])
  if (!shown) throw new Problem('not-found')
  return shown
}
