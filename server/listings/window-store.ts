import { and, asc, eq, gt, inArray, lte } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listing, pickupWindow } from '@/db/schema/listings'

export type WindowRow = typeof pickupWindow.$inferSelect
export type NewWindow = typeof pickupWindow.$inferInsert

/** All windows of a listing, past and closed ones too, kept from others until the transaction ends. */
export async function lockWindows(listingId: number, tx: Tx): Promise<WindowRow[]> {
  return tx.select().from(pickupWindow).where(eq(pickupWindow.listingId, listingId)).for('update')
}

/** Windows that begin after `at` and are offered. */
export async function listOpenWindows(listingIds: number[], at: Date, tx: Tx = db()): Promise<WindowRow[]> {
  if (listingIds.length === 0) return []
  return tx
    .select()
    .from(pickupWindow)
    .where(
      and(
        inArray(pickupWindow.listingId, listingIds),
        gt(pickupWindow.startsAt, at),
        eq(pickupWindow.closed, 0),
      ),
    )
    .orderBy(asc(pickupWindow.startsAt), asc(pickupWindow.id))
}

export async function insertWindows(rows: NewWindow[], tx: Tx): Promise<void> {
  if (rows.length > 0) await tx.insert(pickupWindow).values(rows)
}

export async function setWindow(id: number, change: Partial<NewWindow>, tx: Tx): Promise<void> {
  await tx.update(pickupWindow).set(change).where(eq(pickupWindow.id, id))
}

/** Live listings with a window that began after `since` and by `at`. */
export async function listBegunListings(since: Date, at: Date): Promise<number[]> {
  const rows = await db()
    .selectDistinct({ id: pickupWindow.listingId })
    .from(pickupWindow)
    .innerJoin(listing, eq(listing.id, pickupWindow.listingId))
    .where(and(eq(listing.state, 'live'), gt(pickupWindow.startsAt, since), lte(pickupWindow.startsAt, at)))
  return rows.map((row) => row.id)
}
