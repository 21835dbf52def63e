import type { Caller } from '@/server/http/caller'
import { fewAtATime } from '@/server/jobs/few-at-a-time'
import type { OrderRow } from '@/server/orders/order-store'
import { findSellerOf } from '@/server/orders/party-store'
import { listShipmentsOf } from '@/server/orders/shipment-store'
import { LANES } from '@/server/weather/check-due-ways'
import { checkWay } from '@/server/weather/check-way'
import { listRoutes } from '@/server/weather/list-routes'
import { listToShip } from '@/server/weather/weather-store'
import { Problem } from '@/shared/api/problem'
import type { ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

const MOST_ROUTES = 200

/** All boxes of one ship day are looked at anew; those that are not safe are held when the seller says so. */
export async function checkRoutes(
  caller: Caller,
  asked: { shipDay: string; hold: boolean },
): Promise<ReplyOf<Endpoints['checkRoutes']>> {
  const seller = await findSellerOf(caller.memberId)
  if (!seller) throw new Problem('not-found')
  const orders = await listToShip(seller.id, MOST_ROUTES)
  const shipments = await listShipmentsOf(orders.map((order) => order.id))
  // A place is asked about anew once; further boxes to it share the answer.
  const asking = new Set<string>()
  let held = 0
  const check = async (order: OrderRow) => {
    const shipment = shipments.find((one) => one.orderId === order.id)
    if (shipment?.shipDay !== asked.shipDay || order.state === 'weather_hold' || order.freeze !== 'none')
      return
    const place = `${shipment.toLat} ${shipment.toLng}`
    const isFresh = !asking.has(place)
    asking.add(place)
    if (await checkWay(order, { kind: 'seller', holds: asked.hold, isFresh })) held += 1
  }
  await fewAtATime(orders, LANES, check)
  return { ...(await listRoutes(caller, MOST_ROUTES)), held }
}
