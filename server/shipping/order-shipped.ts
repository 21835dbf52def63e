import type { Tx } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import type { OrderSeen } from '@/server/orders/party-of'
import { orderSeenBy } from '@/server/orders/party-of'
import { readSellerById, type SellerRow } from '@/server/orders/party-store'
import { listShipmentsOf, readShipment, type ShipmentRow } from '@/server/orders/shipment-store'
import { readTermsOf } from '@/server/orders/terms-store'
import { Problem } from '@/shared/api/problem'
import type { FishBody } from '@/shared/contracts/fish-batch'

export interface OrderShipped extends OrderSeen {
  shipment: ShipmentRow
  terms: FishBody
  seller: SellerRow
}

const notShipped = () => new Problem('order-moved', 'This order is collected; nothing of it is shipped.')

/** An order that is shipped, with all that its way hangs on, for whoever may see it. */
export async function orderShipped(caller: Caller, orderId: string): Promise<OrderShipped> {
  const seen = await orderSeenBy(caller, orderId)
  return withShipment(seen)
}

/** The same for one party alone: to everybody else the act does not exist. */
export async function orderShippedFor(
  party: 'buyer' | 'seller',
  caller: Caller,
  orderId: string,
): Promise<OrderShipped> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== party) throw new Problem('not-found')
  return withShipment(seen)
}

async function withShipment(seen: OrderSeen): Promise<OrderShipped> {
  const { order } = seen
  const [[shipment], terms, seller] = await Promise.all([
    listShipmentsOf([order.id]),
    readTermsOf([order.listingVersionId]),
    readSellerById(order.sellerId),
  ])
  const body = terms.get(order.listingVersionId)
  if (!shipment || (body && body.category !== 'fish')) throw notShipped()
  if (!body || !seller) throw new Problem('not-found')
  return { ...seen, shipment, terms: body, seller }
}

/** The shipment as it stands under the order's lock. */
export async function requireShipment(tx: Tx, orderId: number): Promise<ShipmentRow> {
  const shipment = await readShipment(tx, orderId)
  if (!shipment) throw notShipped()
  return shipment
}
