import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { OrderRow } from '@/server/orders/order-store'
import { moveStock } from '@/server/orders/stock-store'
import { projectListings } from '@/server/search/project-listings'

interface Came {
  order: OrderRow
  by: string | null
  /** null: they are lost, and nowhere any more. */
  to: 'delivered' | null
}

/** The machine leaves the animals of a late box on their way; whoever ends the claim says what became of them. */
export async function moveLateBox(tx: Tx, { order, by, to }: Came): Promise<void> {
  await moveStock(tx, {
    listingId: order.listingId,
    orderId: order.id,
    reason: to === null ? 'lost-on-the-way' : 'arrived-late',
    quantity: order.quantity,
    moves:
      to === null
        ? [['shipped', -1]]
        : [
            ['shipped', -1],
            [to, 1],
          ],
    by,
    at: now(),
  })
  await projectListings(tx, [order.listingId])
}
