import { isStaff, type Caller } from '@/server/http/caller'
import { readOrder, type OrderRow } from '@/server/orders/order-store'
import { findSellerOf } from '@/server/orders/party-store'
import type { Party } from '@/server/orders/order-policy'
import { Problem } from '@/shared/api/problem'

export interface OrderSeen {
  order: OrderRow
  party: Party
}

/** The order and who the caller is in it. Somebody else's order is a 404, word for word like one that never was. */
export async function orderSeenBy(caller: Caller, publicId: string): Promise<OrderSeen> {
  const order = await readOrder(publicId)
  if (!order) throw new Problem('not-found')
  if (order.buyerId === caller.memberId) return { order, party: 'buyer' }
  const seller = await findSellerOf(caller.memberId)
  if (seller?.id === order.sellerId) return { order, party: 'seller' }
  if (isStaff(caller) && caller.hasSecondFactor) return { order, party: 'staff' }
  throw new Problem('not-found')
}
