import type { OrderRow } from '@/server/orders/order-store'
import type { SellerRow } from '@/server/orders/party-store'
import type { ShipmentRow } from '@/server/orders/shipment-store'
import type { FoundPlace } from '@/server/places/find-place'
import type { AskedWay } from '@/server/shipping/judge-way'
import { shippingOf } from '@/server/shipping/ship-rule'
import type { FishBody } from '@/shared/contracts/fish-batch'
import { boxCharges, type BoxCharges } from '@/shared/domain/shipping/box-charges'

/** A way between two areas, each known by its middle and its town; the day is asked for later. */
export interface ShipWay extends Pick<AskedWay, 'terms' | 'quantity' | 'from' | 'to'> {
  charges: BoxCharges
  /** The seller's. */
  zone: string
}

const townOf = (place: FoundPlace) => place.label.replace(/ \d{5}$/, '')

const fromSeller = ({ cellLat, cellLng, city, state }: SellerRow) => ({
  lat: cellLat,
  lng: cellLng,
  name: `${city}, ${state}`,
})

interface Wanted {
  terms: FishBody
  quantity: number
  seller: SellerRow
}

/** The way to a place that somebody asks about. */
export function wayTo({ terms, quantity, seller }: Wanted, place: FoundPlace): ShipWay {
  return {
    ...{ terms, quantity, zone: seller.zone },
    charges: boxCharges(quantity, shippingOf(terms)),
    from: fromSeller(seller),
    to: { ...place.centre, name: townOf(place) },
  }
}

interface OfOrder {
  order: OrderRow
  terms: FishBody
  seller: SellerRow
  shipment: ShipmentRow
}

/** The way of an order as it was agreed: boxes and charges are the order's own. */
export function wayOfOrder({ order, terms, seller, shipment }: OfOrder): ShipWay {
  const { toLat, toLng, address, boxes } = shipment
  return {
    ...{ terms, quantity: order.quantity, zone: order.zone },
    charges: { boxes, boxCents: order.boxCents, freightCents: order.freightCents },
    from: fromSeller(seller),
    to: { lat: toLat, lng: toLng, name: `${address.city}, ${address.state}` },
  }
}
