import type { Caller } from '@/server/http/caller'
import { offerShipDays } from '@/server/shipping/offer-ship-days'
import { orderShipped } from '@/server/shipping/order-shipped'
import { firstShipDay } from '@/server/shipping/ship-rule'
import { wayOfOrder } from '@/server/shipping/ship-way'
import { Problem } from '@/shared/api/problem'
import type { ShipDayOffers } from '@/shared/contracts/shipments'

/** The days an order could be moved to, for its two parties. */
export async function listOrderShipDays(caller: Caller, orderId: string): Promise<ShipDayOffers> {
  const shipped = await orderShipped(caller, orderId)
  if (shipped.party === 'staff') throw new Problem('not-allowed', 'The parties move the day between them.')
  return offerShipDays(wayOfOrder(shipped), firstShipDay(shipped.terms, shipped.order.zone))
}
