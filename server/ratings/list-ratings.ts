import { readPeople } from '@/server/orders/party-store'
import { presentRating } from '@/server/ratings/present-rating'
import { listRatingRows } from '@/server/ratings/rating-store'
import { findSellerByPublicId } from '@/server/sellers/seller-store'
import { readCursor, writeCursor } from '@/shared/api/cursor'
import type { ParsedQuery, ReplyOf } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'
import type { Endpoints } from '@/shared/api/routes.gen'

type Asked = ParsedQuery<Endpoints['listRatings']>

/** Newest first, page by page; nothing that is negative is left out. */
export async function listRatings(
  sellerId: string,
  asked: Asked,
): Promise<ReplyOf<Endpoints['listRatings']>> {
  const seller = await findSellerByPublicId(sellerId)
  if (!seller) throw new Problem('not-found')
  const beforeId = asked.cursor ? Number(readCursor(asked.cursor).id) : undefined
  if (beforeId !== undefined && !Number.isSafeInteger(beforeId)) throw new Problem('cursor-unreadable')
  const rows = await listRatingRows({ sellerId: seller.id, beforeId, limit: asked.limit + 1 })
  const page = rows.slice(0, asked.limit)
  const people = await readPeople([...new Set(page.map((row) => row.buyerId))])
  const items = page.map((row) => presentRating(row, people.get(row.buyerId)?.name))
  const last = page.at(-1)
  return rows.length > asked.limit && last ? { items, nextCursor: writeCursor({ id: last.id }) } : { items }
}
