import { and, count, desc, eq, inArray, lt, notInArray, or, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listing } from '@/db/schema/listings'
import { order } from '@/db/schema/orders'
import type { ListingDraft } from '@/shared/contracts/listings'

export type ListingRow = typeof listing.$inferSelect
type NewListing = typeof listing.$inferInsert

export async function insertListing(row: NewListing, tx: Tx): Promise<void> {
  await tx.insert(listing).values(row)
}

export async function findListing(publicId: string, tx: Tx = db()): Promise<ListingRow | null> {
  const [found] = await tx.select().from(listing).where(eq(listing.publicId, publicId))
  return found ?? null
}

export async function findListingById(id: number, tx: Tx = db()): Promise<ListingRow | null> {
  const [found] = await tx.select().from(listing).where(eq(listing.id, id))
  return found ?? null
}

/** The row as it stands now, kept from others until the transaction ends. */
export async function lockListing(id: number, tx: Tx): Promise<ListingRow | null> {
  const [found] = await tx.select().from(listing).where(eq(listing.id, id)).for('update')
  return found ?? null
}

export interface ListingsAfter {
  updatedAt: Date
  id: number
}

/** A seller's listings, newest change first. */
export async function listListingsOf(
  sellerId: number,
  page: { after: ListingsAfter | null; limit: number },
): Promise<ListingRow[]> {
  const { after } = page
  const later =
    after &&
    or(
      lt(listing.updatedAt, after.updatedAt),
      and(eq(listing.updatedAt, after.updatedAt), lt(listing.id, after.id)),
    )
  return db()
    .select()
    .from(listing)
    .where(and(eq(listing.sellerId, sellerId), later ?? undefined))
    .orderBy(desc(listing.updatedAt), desc(listing.id))
    .limit(page.limit)
}

export async function listListingIdsOf(sellerId: number, tx: Tx): Promise<number[]> {
  const rows = await tx.select({ id: listing.id }).from(listing).where(eq(listing.sellerId, sellerId))
  return rows.map((row) => row.id)
}

export async function pauseListingsOf(sellerId: number, at: Date, tx: Tx): Promise<void> {
  await tx
    .update(listing)
    .set({ state: 'paused', updatedAt: at })
    .where(and(eq(listing.sellerId, sellerId), eq(listing.state, 'live')))
}

export async function setListing(id: number, change: Partial<NewListing>, tx: Tx): Promise<void> {
  await tx.update(listing).set(change).where(eq(listing.id, id))
}

/** Keeps the draft only if nobody kept a newer one; false when somebody did. */
export async function saveDraftIf(
  id: number,
  seen: { draftRevision: number; draft: ListingDraft; at: Date },
): Promise<boolean> {
  const [done] = await db()
    .update(listing)
    .set({ draft: seen.draft, draftRevision: sql`${listing.draftRevision} + 1`, updatedAt: seen.at })
    .where(and(eq(listing.id, id), eq(listing.draftRevision, seen.draftRevision)))
  return done.affectedRows === 1
}

export async function deleteListing(id: number, tx: Tx): Promise<void> {
  await tx.delete(listing).where(eq(listing.id, id))
}

/** Orders of each listing that are not over yet. */
export async function countOpenOrders(listingIds: number[], tx: Tx = db()): Promise<Map<number, number>> {
  if (listingIds.length === 0) return new Map()
  const rows = await tx
    .select({ listingId: order.listingId, open: count() })
    .from(order)
    .where(and(inArray(order.listingId, listingIds), notInArray(order.state, ['settled', 'cancelled'])))
    .groupBy(order.listingId)
  return new Map(rows.map((row) => [row.listingId, row.open]))
}

export async function countRemovedOf(sellerId: number, tx: Tx): Promise<number> {
  return tx.$count(listing, and(eq(listing.sellerId, sellerId), eq(listing.state, 'taken_down')))
}
