import type { OrderRow } from '@/server/orders/order-store'
import { readSellerById } from '@/server/orders/party-store'
import { listShipmentsOf, type ShipmentRow } from '@/server/orders/shipment-store'
import { readTermsOf } from '@/server/orders/terms-store'
import { wayOfOrder, type ShipWay } from '@/server/shipping/ship-way'

/** An order that is shipped, and its way. */
export interface OrderWay {
  order: OrderRow
  shipment: ShipmentRow
  way: ShipWay
}

/** Null: the order is collected. Read outside of transactions: a forecast may be waited for with it. */
export async function loadOrderWay(order: OrderRow): Promise<OrderWay | null> {
  const [shipment] = await listShipmentsOf([order.id])
  if (!shipment) return null
  const [seller, versions] = await Promise.all([
    readSellerById(order.sellerId),
    readTermsOf([order.listingVersionId]),
  ])
  const terms = versions.get(order.listingVersionId)
  if (!seller || terms?.category !== 'fish')
    throw new Error(`order ${order.id} has lost its seller or the batch it ships`)
  return { order, shipment, way: wayOfOrder({ order, terms, seller, shipment }) }
}
