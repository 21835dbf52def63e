import { and, desc, eq, lt, ne, sql } from 'drizzle-orm'

import { db } from '@/db/client'
import { listingSearch } from '@/db/schema/listing-search'
import { listing, listingVersion } from '@/db/schema/listings'
import type { ListingBody } from '@/shared/contracts/listings'
import { stateBit } from '@/shared/domain/rules/state-bits'

export interface OnSaleRow {
  listingId: number
  body: ListingBody
}

/** Without what people of this state must not be shown; no state, nothing is left out. */
function shownTo(buyerState: string | undefined) {
  const bit = buyerState === undefined ? null : stateBit(buyerState)
  return bit === null ? undefined : sql`(${listingSearch.hiddenStates} & ${bit}) = 0`
}

/**
 * What of a seller's can be found now, the newest first. Found through the seller's listings, as search has no index
 * of sellers.
 */
export async function listOnSale(
  sellerId: number,
  page: { buyerState: string | undefined; beforeId: number | undefined; limit: number },
): Promise<OnSaleRow[]> {
  const rows = await db()
    .select({ listingId: listing.id, body: listingVersion.body })
    .from(listing)
    .innerJoin(listingSearch, eq(listingSearch.listingId, listing.id))
    .innerJoin(
      listingVersion,
      and(eq(listingVersion.listingId, listing.id), eq(listingVersion.number, listing.liveVersion)),
    )
    .where(
      and(
        eq(listing.sellerId, sellerId),
        eq(listing.state, 'live'),
        shownTo(page.buyerState),
        page.beforeId === undefined ? undefined : lt(listing.id, page.beforeId),
      ),
    )
    .orderBy(desc(listing.id))
    .limit(page.limit)
  return rows.map((row) => ({ ...row, body: row.body as ListingBody }))
}

/** How many of a seller's listings can be found now, without one of them. */
export async function countOnSale(
  sellerId: number,
  asked: { buyerState: string | undefined; exceptId: number },
): Promise<number> {
  const [row] = await db()
    .select({ many: sql<number>`count(*)` })
    .from(listing)
    .innerJoin(listingSearch, eq(listingSearch.listingId, listing.id))
    .where(
      and(
        eq(listing.sellerId, sellerId),
        eq(listing.state, 'live'),
        shownTo(asked.buyerState),
        ne(listing.id, asked.exceptId),
      ),
    )
  return Number(row?.many ?? 0)
}
