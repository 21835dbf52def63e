import { and, count, desc, eq, inArray, ne } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listing, listingVersion } from '@/db/schema/listings'
import type { ListingBody } from '@/shared/contracts/listings'

type Row = typeof listingVersion.$inferSelect
export type VersionRow = Omit<Row, 'body'> & { body: ListingBody }
export type NewVersion = Omit<typeof listingVersion.$inferInsert, 'body'> & { body: ListingBody }

/** Bodies were checked whole when they were submitted; nothing else writes them. */
const versionOf = (row: Row): VersionRow => ({ ...row, body: row.body as ListingBody })

export async function insertVersion(row: NewVersion, tx: Tx): Promise<number> {
  const [made] = await tx.insert(listingVersion).values(row).$returningId()
  if (!made) throw new Error('the listing version has no number')
  return made.id
}

export async function findVersion(
  listingId: number,
  number: number,
  tx: Tx = db(),
): Promise<VersionRow | null> {
  const [found] = await tx
    .select()
    .from(listingVersion)
    .where(and(eq(listingVersion.listingId, listingId), eq(listingVersion.number, number)))
  return found ? versionOf(found) : null
}

export async function findVersionById(id: number, tx: Tx = db()): Promise<VersionRow | null> {
  const [found] = await tx.select().from(listingVersion).where(eq(listingVersion.id, id))
  return found ? versionOf(found) : null
}

export async function lockVersion(id: number, tx: Tx): Promise<VersionRow | null> {
  const [found] = await tx.select().from(listingVersion).where(eq(listingVersion.id, id)).for('update')
  return found ? versionOf(found) : null
}

export async function findLatestVersion(listingId: number, tx: Tx = db()): Promise<VersionRow | null> {
  const [found] = await tx
    .select()
    .from(listingVersion)
    .where(eq(listingVersion.listingId, listingId))
    .orderBy(desc(listingVersion.number))
    .limit(1)
  return found ? versionOf(found) : null
}

/** The newest version of each listing, without its body. */
export async function listLatestReviews(
  listingIds: number[],
): Promise<Map<number, Pick<Row, 'number' | 'review' | 'reasonCode' | 'reasonText' | 'flags'>>> {
  if (listingIds.length === 0) return new Map()
  const rows = await db()
    .select({
      listingId: listingVersion.listingId,
      number: listingVersion.number,
      review: listingVersion.review,
      reasonCode: listingVersion.reasonCode,
      reasonText: listingVersion.reasonText,
      flags: listingVersion.flags,
    })
    .from(listingVersion)
    .where(inArray(listingVersion.listingId, listingIds))
    .orderBy(listingVersion.listingId, listingVersion.number)
  return new Map(rows.map(({ listingId, ...row }) => [listingId, row]))
}

export async function setVersion(id: number, change: Partial<NewVersion>, tx: Tx): Promise<void> {
  await tx.update(listingVersion).set(change).where(eq(listingVersion.id, id))
}

/** A newer submission takes the place of one that still waits; a listing taken off sale takes it along. */
export async function supersedeWaiting(listingId: number, at: Date, tx: Tx): Promise<void> {
  await tx
    .update(listingVersion)
    .set({ review: 'superseded', decidedAt: at })
    .where(and(eq(listingVersion.listingId, listingId), eq(listingVersion.review, 'waiting')))
}

const MOST_BODIES = 200

/** Bodies of the seller's other listings, newest first: where the same photo may have served before. */
export async function listOtherBodies(
  seller: { sellerId: number; exceptListingId: number },
  tx: Tx,
): Promise<ListingBody[]> {
  const rows = await tx
    .select({ body: listingVersion.body })
    .from(listingVersion)
    .innerJoin(listing, eq(listing.id, listingVersion.listingId))
    .where(and(eq(listing.sellerId, seller.sellerId), ne(listing.id, seller.exceptListingId)))
    .orderBy(desc(listingVersion.id))
    .limit(MOST_BODIES)
  return rows.map((row) => row.body as ListingBody)
}

/** How often a moderator said yes and no to this seller. */
export async function countDecisions(sellerId: number): Promise<{ approved: number; rejected: number }> {
  const rows = await db()
    .select({ review: listingVersion.review, times: count() })
    .from(listingVersion)
    .innerJoin(listing, eq(listing.id, listingVersion.listingId))
    .where(and(eq(listing.sellerId, sellerId), inArray(listingVersion.review, ['approved', 'rejected'])))
    .groupBy(listingVersion.review)
  const times = (review: string) => rows.find((row) => row.review === review)?.times ?? 0
  return { approved: times('approved'), rejected: times('rejected') }
}
