import type { Tx } from '@/db/transaction'
import type { LetterFacts } from '@/server/orders/letters/letter-facts'
import { orderSettings } from '@/server/orders/order-settings'
import { listEventsOf, type OrderRow } from '@/server/orders/order-store'
import { readPeople, readSellerById } from '@/server/orders/party-store'
import { readShipment } from '@/server/orders/shipment-store'
import { agreementOf } from '@/server/orders/slot-agreement'
import { readTerms } from '@/server/orders/terms-store'

/** Everything a mail about this order may say; null when a party has left. */
export async function loadLetterFacts(tx: Tx, order: OrderRow): Promise<LetterFacts | null> {
  const seller = await readSellerById(order.sellerId, tx)
  if (!seller) throw new Error(`seller ${order.sellerId} is gone`)
  const people = await readPeople([order.buyerId, seller.memberId], tx)
  const buyer = people.get(order.buyerId)
  const sellerPerson = people.get(seller.memberId)
  if (!buyer || !sellerPerson) return null
  const terms = await readTerms(tx, order.listingVersionId)
  const agreement = agreementOf(await listEventsOf([order.id], tx))
  const shipment = (await readShipment(tx, order.id)) ?? null
  const { origin } = orderSettings()
  return { order, terms, seller, buyer, sellerPerson, origin, agreement, shipment }
}
