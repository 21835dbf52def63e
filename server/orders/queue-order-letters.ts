import type { Tx } from '@/db/transaction'
import { queueMail } from '@/server/mail/queue-mail'
import { orderLetters } from '@/server/orders/letters/order-letters'
import { orderSettings } from '@/server/orders/order-settings'
import type { OrderRow } from '@/server/orders/order-store'
import { readPeople, readSellerById } from '@/server/orders/party-store'
import { readTerms } from '@/server/orders/terms-store'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'

const DATE_FOLLOWS = new Set<EdgeId>(['E05', 'E07'])

/** Queues the mails of an edge with the change itself. Where the date follows in the same breath, one mail says both. */
export async function queueOrderLetters(tx: Tx, edge: EdgeId, order: OrderRow): Promise<void> {
  const write = orderLetters[edge]
  if (!write || (DATE_FOLLOWS.has(edge) && order.windowId !== null)) return
  const seller = await readSellerById(order.sellerId, tx)
  if (!seller) throw new Error(`seller ${order.sellerId} is gone`)
  const people = await readPeople([order.buyerId, seller.memberId], tx)
  const buyer = people.get(order.buyerId)
  const sellerPerson = people.get(seller.memberId)
  if (!buyer || !sellerPerson) return
  const terms = await readTerms(tx, order.listingVersionId)
  const { origin } = orderSettings()
  for (const letter of write({ order, terms, seller, buyer, sellerPerson, origin }))
    await queueMail(letter, tx)
}
