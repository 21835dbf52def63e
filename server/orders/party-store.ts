import { eq, inArray, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { user } from '@/db/schema/auth'
import { listing, pickupWindow } from '@/db/schema/listings'
import { memberProfile } from '@/db/schema/members'
import { seller } from '@/db/schema/sellers'

export type SellerRow = typeof seller.$inferSelect

export async function findSellerOf(memberId: string, tx: Tx = db()): Promise<SellerRow | undefined> {
  const [row] = await tx.select().from(seller).where(eq(seller.memberId, memberId))
  return row
}

export async function readSellerById(id: number, tx: Tx = db()): Promise<SellerRow | undefined> {
  const [row] = await tx.select().from(seller).where(eq(seller.id, id))
  return row
}

export async function readSellers(ids: number[]): Promise<Map<number, SellerRow>> {
  if (ids.length === 0) return new Map()
  const rows = await db().select().from(seller).where(inArray(seller.id, ids))
  return new Map(rows.map((row) => [row.id, row]))
}

export async function readPeople(
  ids: string[],
  tx: Tx = db(),
): Promise<Map<string, { memberId: string; name: string; email: string }>> {
  if (ids.length === 0) return new Map()
  const rows = await tx
    .select({ id: user.id, name: user.name, email: user.email })
    .from(user)
    .where(inArray(user.id, ids))
  return new Map(rows.map(({ id, name, email }) => [id, { memberId: id, name, email }]))
}

export async function readListingRow(
  publicId: string,
  tx: Tx = db(),
): Promise<typeof listing.$inferSelect | undefined> {
  const [row] = await tx.select().from(listing).where(eq(listing.publicId, publicId))
  return row
}

export async function readListingIds(ids: number[]): Promise<Map<number, string>> {
  if (ids.length === 0) return new Map()
  const rows = await db()
    .select({ id: listing.id, publicId: listing.publicId })
    .from(listing)
    .where(inArray(listing.id, ids))
  return new Map(rows.map((row) => [row.id, row.publicId]))
}

export async function readPlaceKinds(windowIds: number[]): Promise<Map<number, string>> {
  if (windowIds.length === 0) return new Map()
  const rows = await db()
    .select({ id: pickupWindow.id, placeKind: pickupWindow.placeKind })
    .from(pickupWindow)
    .where(inArray(pickupWindow.id, windowIds))
  return new Map(rows.map((row) => [row.id, row.placeKind]))
}

/** Public ids of pickup windows by their numbers. */
export async function readWindowIds(windowIds: number[]): Promise<Map<number, string>> {
  if (windowIds.length === 0) return new Map()
  const rows = await db()
    .select({ id: pickupWindow.id, publicId: pickupWindow.publicId })
    .from(pickupWindow)
    .where(inArray(pickupWindow.id, windowIds))
  return new Map(rows.map((row) => [row.id, row.publicId]))
}

/** Response record: an answer in time, or none. */
export async function markAnswerMissed(tx: Tx, sellerId: number): Promise<void> {
  await tx
    .update(seller)
    .set({ answersMissed: sql`${seller.answersMissed} + 1` })
    .where(eq(seller.id, sellerId))
}

/** A day promised and missed. */
export async function markDayMissed(tx: Tx, sellerId: number): Promise<void> {
  await tx
    .update(seller)
    .set({ daysMissed: sql`${seller.daysMissed} + 1` })
    .where(eq(seller.id, sellerId))
}

/** A buyer who did not come. */
export async function markNoShow(tx: Tx, memberId: string, at: Date): Promise<void> {
  await tx
    .insert(memberProfile)
    .values({ memberId, noShows: 1, updatedAt: at })
    .onDuplicateKeyUpdate({ set: { noShows: sql`${memberProfile.noShows} + 1` } })
}

export async function markAnswered(tx: Tx, sellerId: number): Promise<void> {
  await tx
    .update(seller)
    .set({ answeredInTime: sql`${seller.answeredInTime} + 1` })
    .where(eq(seller.id, sellerId))
}
