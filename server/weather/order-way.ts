import type { OrderRow } from '@/server/orders/order-store'
import { readSellerById, type SellerRow } from '@/server/orders/party-store'
import { listShipmentsOf, type ShipmentRow } from '@/server/orders/shipment-store'
import { readTermsOf } from '@/server/orders/terms-store'
import type { AskedWay } from '@/server/shipping/judge-way'
import { noShipDaysFrom } from '@/server/shipping/no-ship-days'
import type { ListingBody } from '@/shared/contracts/listings'
import { packingClasses } from '@/shared/domain/season/season-classes.facts'
import type { ShipDayRule } from '@/shared/domain/shipping/ship-days'

/** An order that is shipped, with all that its way is judged by. */
export interface OrderWay {
  order: OrderRow
  shipment: ShipmentRow
  terms: ListingBody
  seller: SellerRow
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
  if (!seller || !terms) throw new Error(`order ${order.id} has lost its seller or its terms`)
  return { order, shipment, terms, seller }
}

/** The question for `judgeWay`: the order's own way, on its agreed day or on another one. */
export function askWay(way: OrderWay, shipDay: string, isFresh: boolean): AskedWay {
  const { order, shipment, terms, seller } = way
  return {
    terms,
    quantity: order.quantity,
    boxes: shipment.boxes,
    shipDay,
    from: { lat: seller.cellLat, lng: seller.cellLng, name: `${seller.city}, ${seller.state}` },
    to: {
      lat: shipment.toLat,
      lng: shipment.toLng,
      name: `${shipment.address.city}, ${shipment.address.state}`,
    },
    isFresh,
  }
}

/** Which days are lawful for this batch, by its terms and the days without carriers. */
export async function shipDayRuleOf(terms: ListingBody, fromDay: string): Promise<ShipDayRule> {
  const { shipping } = terms
  if (!shipping) throw new Error('this batch is not shipped')
  return {
    days: shipping.days,
    nights: packingClasses[shipping.packing].nights,
    noShipDays: await noShipDaysFrom(fromDay),
  }
}
