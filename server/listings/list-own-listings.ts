import type { Caller } from '@/server/http/caller'
import { findListing, listListingsOf, type ListingsAfter } from '@/server/listings/listing-store'
import { presentOwnListings } from '@/server/listings/present-own-listing'
import { requireSeller } from '@/server/sellers/require-seller'
import { readCursor, writeCursor } from '@/shared/api/cursor'
import { Problem } from '@/shared/api/problem'
import type { OwnListing } from '@/shared/contracts/listings'

/** The cursor carries the public id: inner numbers stay inside. */
async function placeAfter(cursor: string, sellerId: number): Promise<ListingsAfter> {
  const { at, id } = readCursor(cursor)
  const last = typeof id === 'string' ? await findListing(id) : null
  if (typeof at !== 'number' || !last || last.sellerId !== sellerId) throw new Problem('cursor-unreadable')
  return { updatedAt: new Date(at), id: last.id }
}

export async function listOwnListings(
  caller: Caller,
  page: { cursor?: string | undefined; limit: number },
): Promise<{ items: OwnListing[]; nextCursor?: string }> {
  const seller = await requireSeller(caller)
  const after = page.cursor ? await placeAfter(page.cursor, seller.id) : null
  const rows = await listListingsOf(seller.id, { after, limit: page.limit + 1 })
  const shown = rows.slice(0, page.limit)
  const last = rows.length > page.limit ? shown.at(-1) : undefined
  return {
    items: await presentOwnListings(shown),
    ...(last ? { nextCursor: writeCursor({ at: last.updatedAt.getTime(), id: last.publicId }) } : {}),
  }
}
