import type { Caller } from '@/server/http/caller'
import { readListingRow, findSellerOf } from '@/server/orders/party-store'
import { listOrderRows } from '@/server/orders/order-store'
import { presentOrders } from '@/server/orders/present-order'
import { readCursor, writeCursor } from '@/shared/api/cursor'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ParsedQuery, ReplyOf } from '@/shared/api/endpoint'

type Asked = ParsedQuery<Endpoints['listOrders']>
type Page = ReplyOf<Endpoints['listOrders']>

/** The member's orders on one side of the counter, newest first. A seller without a farm has none. */
export async function listOrders(caller: Caller, asked: Asked): Promise<Page> {
  const seller = asked.as === 'seller' ? await findSellerOf(caller.memberId) : undefined
  if (asked.as === 'seller' && !seller) return { items: [] }
  const listing = asked.listing ? await readListingRow(asked.listing) : undefined
  if (asked.listing && !listing) return { items: [] }
  const beforeId = asked.cursor ? Number(readCursor(asked.cursor).id) : undefined
  const rows = await listOrderRows({
    party: seller ? { sellerId: seller.id } : { buyerId: caller.memberId },
    show: asked.show,
    listingId: listing?.id,
    beforeId,
    limit: asked.limit + 1,
  })
  const page = rows.slice(0, asked.limit)
  const shown = await presentOrders(page.map((order) => ({ order, party: seller ? 'seller' : 'buyer' })))
  const items = shown.map((order, at) => ({
    ...order,
    totalCents: order.money.totalCents,
    createdAt: (page[at]?.createdAt ?? new Date()).toISOString(),
  }))
  const last = page.at(-1)
  return rows.length > asked.limit && last ? { items, nextCursor: writeCursor({ id: last.id }) } : { items }
}
