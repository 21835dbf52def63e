import type { Caller } from '@/server/http/caller'
import { mayAct } from '@/server/orders/order-policy'
import { offerShipDays } from '@/server/shipping/offer-ship-days'
import { orderShipped } from '@/server/shipping/order-shipped'
import { firstShipDay } from '@/server/shipping/ship-rule'
import { wayOfOrder } from '@/server/shipping/ship-way'
import { Problem } from '@/shared/api/problem'
import type { ShipDayOffers } from '@/shared/contracts/shipments'

const MOVES = ['choose-ship-day', 'hold-for-weather', 'agree-new-day'] as const

/** The days an order could be moved to, for its two parties, while either may name one. */
export async function listOrderShipDays(caller: Caller, orderId: string): Promise<ShipDayOffers> {
  const shipped = await orderShipped(caller, orderId)
  if (shipped.party === 'staff') throw new Problem('not-allowed', 'The parties move the day between them.')
  const { order, party } = shipped
  if (!MOVES.some((act) => mayAct(act, order, party)))
    throw new Problem('order-moved', 'The day of this order cannot be moved now.')
  return offerShipDays(wayOfOrder(shipped), firstShipDay(shipped.terms, order.zone))
}
