import { and, desc, eq, inArray, lt, sql } from 'drizzle-orm'
import type { AnyMySqlColumn } from 'drizzle-orm/mysql-core'

import { db, type Tx } from '@/db/client'
import { listing } from '@/db/schema/listings'
import { rating } from '@/db/schema/ratings'
import { seller } from '@/db/schema/sellers'

export type RatingRow = typeof rating.$inferSelect

export async function listRatingsOf(orderIds: number[], tx: Tx = db()): Promise<RatingRow[]> {
  if (orderIds.length === 0) return []
  return tx.select().from(rating).where(inArray(rating.orderId, orderIds))
}

/** The row of one order, locked until the transaction ends. */
export async function lockRatingOf(tx: Tx, orderId: number): Promise<RatingRow | undefined> {
  const [row] = await tx.select().from(rating).where(eq(rating.orderId, orderId)).for('update')
  return row
}

export async function findRating(publicId: string, tx: Tx = db()): Promise<RatingRow | undefined> {
  const [row] = await tx.select().from(rating).where(eq(rating.publicId, publicId))
  return row
}

export async function insertRating(tx: Tx, row: typeof rating.$inferInsert): Promise<void> {
  await tx.insert(rating).values(row)
}

export async function setRating(tx: Tx, id: number, change: Partial<RatingRow>): Promise<void> {
  await tx.update(rating).set(change).where(eq(rating.id, id))
}

export async function listRatingRows(page: {
  sellerId: number
  beforeId?: number | undefined
  limit: number
}): Promise<RatingRow[]> {
  return db()
    .select()
    .from(rating)
    .where(
      and(
        eq(rating.sellerId, page.sellerId),
        page.beforeId === undefined ? undefined : lt(rating.id, page.beforeId),
      ),
    )
    .orderBy(desc(rating.id))
    .limit(page.limit)
}

/** First of all that a rating changes, so that two at once count each other. */
export async function lockSeller(tx: Tx, sellerId: number): Promise<void> {
  await tx.select({ id: seller.id }).from(seller).where(eq(seller.id, sellerId)).for('update')
}

/** Counts the ratings of a locked seller anew: the record never drifts from the rows. */
export async function recountRatings(tx: Tx, sellerId: number): Promise<void> {
  const sum = (column: AnyMySqlColumn) => sql<string>`coalesce(sum(${column}), 0)`
  const [all] = await tx
    .select({
      count: sql<string>`count(*)`,
      fish: sum(rating.fishMark),
      counted: sum(rating.countMark),
      contact: sum(rating.contactMark),
    })
    .from(rating)
    .where(eq(rating.sellerId, sellerId))
  if (!all) return
  const [fish, counted, contact] = [Number(all.fish), Number(all.counted), Number(all.contact)]
  await tx
    .update(seller)
    .set({
      ratingCount: Number(all.count),
      ratingSum: fish + counted + contact,
      fishMarkSum: fish,
      countMarkSum: counted,
      contactMarkSum: contact,
    })
    .where(eq(seller.id, sellerId))
}

export async function listLiveListingIds(tx: Tx, sellerId: number): Promise<number[]> {
  const rows = await tx
    .select({ id: listing.id })
    .from(listing)
    .where(and(eq(listing.sellerId, sellerId), eq(listing.state, 'live')))
  return rows.map((row) => row.id)
}
