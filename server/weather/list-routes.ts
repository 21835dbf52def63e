import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { describeListing } from '@/server/listings/describe-listing'
import { findSellerOf, readPeople } from '@/server/orders/party-store'
import { listShipmentsOf } from '@/server/orders/shipment-store'
import { readTermsOf } from '@/server/orders/terms-store'
import { presentRoute } from '@/server/weather/present-route'
import { listChecksOfDay, listToShip } from '@/server/weather/weather-store'
import { Problem } from '@/shared/api/problem'
import type { ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

/** Every order the seller has still to ship, by day. */
export async function listRoutes(caller: Caller, limit: number): Promise<ReplyOf<Endpoints['listRoutes']>> {
  const seller = await findSellerOf(caller.memberId)
  if (!seller) throw new Problem('not-found')
  const orders = await listToShip(seller.id, limit)
  const ids = orders.map((order) => order.id)
  const [shipments, checks, people, terms] = await Promise.all([
    listShipmentsOf(ids),
    listChecksOfDay(ids),
    readPeople([...new Set(orders.map((order) => order.buyerId))]),
    readTermsOf([...new Set(orders.map((order) => order.listingVersionId))]),
  ])
  const rows = orders.flatMap((order) => {
    const shipment = shipments.find((one) => one.orderId === order.id)
    const body = terms.get(order.listingVersionId)
    if (!shipment || !body) return []
    const check = checks.find((one) => one.orderId === order.id)
    const buyerName = people.get(order.buyerId)?.name ?? 'A member who left'
    return [presentRoute({ order, shipment, title: describeListing(body).title, buyerName, check })]
  })
  return { rows, asOf: now().toISOString() }
}
