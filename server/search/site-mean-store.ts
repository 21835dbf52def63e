import { and, asc, eq, gt, sql } from 'drizzle-orm'

import { db } from '@/db/client'
import { listing } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'

export async function sumAllRatings(): Promise<{ ratingCount: number; ratingSum: number }> {
  const [all] = await db()
    .select({
      count: sql<string>`coalesce(sum(${seller.ratingCount}), 0)`,
      sum: sql<string>`coalesce(sum(${seller.ratingSum}), 0)`,
    })
    .from(seller)
    .where(gt(seller.ratingCount, 0))
  return { ratingCount: Number(all?.count ?? 0), ratingSum: Number(all?.sum ?? 0) }
}

/** Live listings of rated sellers, from the one after `after` on. */
export async function listRatedListings(after: number, most: number): Promise<number[]> {
  const rows = await db()
    .select({ id: listing.id })
    .from(listing)
    .innerJoin(seller, eq(seller.id, listing.sellerId))
    .where(and(eq(listing.state, 'live'), gt(seller.ratingCount, 0), gt(listing.id, after)))
    .orderBy(asc(listing.id))
    .limit(most)
  return rows.map((row) => row.id)
}
