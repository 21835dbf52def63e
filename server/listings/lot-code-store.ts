import { and, eq, ne, sql } from 'drizzle-orm'

import type { Tx } from '@/db/client'
import { listing, listingVersion } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'

/** Lot codes are given one at a time: two submissions of one seller wait for each other. */
export async function lockSellersLots(sellerId: number, tx: Tx): Promise<void> {
  await tx.select({ id: seller.id }).from(seller).where(eq(seller.id, sellerId)).for('update')
}

interface Harvest {
  sellerId: number
  exceptListingId: number
  harvestDay: string
}

/** Codes that the seller's other listings of that harvest day bear, in any version. */
export async function listLotCodes(harvest: Harvest, tx: Tx): Promise<string[]> {
  const code = sql<string | null>`json_value(${listingVersion.body}, '$.lotCode')`
  const rows = await tx
    .selectDistinct({ code })
    .from(listingVersion)
    .innerJoin(listing, eq(listing.id, listingVersion.listingId))
    .where(
      and(
        eq(listing.sellerId, harvest.sellerId),
        ne(listing.id, harvest.exceptListingId),
        eq(sql`json_value(${listingVersion.body}, '$.harvest.day')`, harvest.harvestDay),
      ),
    )
  return rows.flatMap((row) => (row.code === null ? [] : [row.code]))
}

/** Whether a moderator has approved cut or washed produce of this seller before, papers and all. */
export async function hasApprovedCut(sellerId: number, tx: Tx): Promise<boolean> {
  const [row] = await tx
    .select({ id: listingVersion.id })
    .from(listingVersion)
    .innerJoin(listing, eq(listing.id, listingVersion.listingId))
    .where(
      and(
        eq(listing.sellerId, sellerId),
        eq(listingVersion.review, 'approved'),
        sql`${listingVersion.decidedBy} is not null`,
        eq(sql`json_value(${listingVersion.body}, '$.form')`, 'cut-mixed-or-washed'),
      ),
    )
    .limit(1)
  return row !== undefined
}
