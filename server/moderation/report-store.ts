import { and, asc, count, desc, eq, gt, inArray, lte, max, min, ne, notInArray, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listing, listingVersion } from '@/db/schema/listings'
import { listingReport } from '@/db/schema/moderation'
import { seller } from '@/db/schema/sellers'
import type { ListingBody } from '@/shared/contracts/listings'

export type ReportRow = typeof listingReport.$inferSelect
type NewReport = typeof listingReport.$inferInsert

/** How many reports of a listing the desk shows in their own words. */
const MOST_SHOWN = 3

/** What still waits for a moderator. */
const isOpen = eq(listingReport.open, 1)

export async function insertReport(row: NewReport, tx: Tx): Promise<void> {
  await tx.insert(listingReport).values(row)
}

export async function findOpenReport(
  of: { listingId: number; reporterId: string },
  tx: Tx = db(),
): Promise<ReportRow | null> {
  const [found] = await tx
    .select()
    .from(listingReport)
    .where(
      and(eq(listingReport.listingId, of.listingId), eq(listingReport.reporterId, of.reporterId), isOpen),
    )
  return found ?? null
}

/** When the newest open report of a listing came; null when it has none. */
export async function readNewestAt(listingId: number, tx: Tx): Promise<Date | null> {
  const [row] = await tx
    .select({ newestAt: max(listingReport.createdAt) })
    .from(listingReport)
    .where(and(eq(listingReport.listingId, listingId), isOpen))
  return row?.newestAt ?? null
}

export interface Closing {
  outcome: 'nothing-wrong' | 'taken-down'
  closingReason?: string | null
  note?: string | null
  closedBy: string
  closedAt: Date
}

/** Closes every open report of a listing; answers how many there were. */
export async function closeReports(listingId: number, closing: Closing, tx: Tx): Promise<number> {
  const [done] = await tx
    .update(listingReport)
    .set({ ...closing, open: null })
    .where(and(eq(listingReport.listingId, listingId), isOpen))
  return done.affectedRows
}

export interface ReportedRow {
  listingId: number
  publicId: string
  state: string
  body: ListingBody
  farmName: string
  people: number
  firstId: number
  firstAt: Date
  newestAt: Date
}

/** Listings with open reports by their oldest one, without those this moderator has a stake in. */
export async function listReported(
  except: { memberId: string; categories: string[] },
  page: { afterId: number | null; limit: number },
): Promise<ReportedRow[]> {
  const firstId = min(listingReport.id)
  const rows = await db()
    .select({
      listingId: listing.id,
      publicId: listing.publicId,
      state: listing.state,
      body: listingVersion.body,
      farmName: seller.farmName,
      people: count(),
      firstId,
      firstAt: min(listingReport.createdAt),
      newestAt: max(listingReport.createdAt),
    })
    .from(listingReport)
    .innerJoin(listing, eq(listing.id, listingReport.listingId))
    .innerJoin(
      listingVersion,
      and(eq(listingVersion.listingId, listing.id), eq(listingVersion.number, listing.liveVersion)),
    )
    .innerJoin(seller, eq(seller.id, listing.sellerId))
    .where(
      and(
        isOpen,
        ne(seller.memberId, except.memberId),
        except.categories.length > 0 ? notInArray(listing.category, except.categories) : undefined,
      ),
    )
    .groupBy(listing.id, listingVersion.id, seller.id)
    .having(page.afterId === null ? undefined : gt(firstId, page.afterId))
    .orderBy(asc(firstId))
    .limit(page.limit)
  return rows.flatMap(({ firstId: id, firstAt, newestAt, ...row }) =>
    id === null || !firstAt || !newestAt
      ? []
      : [{ ...row, body: row.body as ListingBody, firstId: id, firstAt, newestAt }],
  )
}

/** The newest open reports of each listing, newest first. */
export async function listNewestReports(
  listingIds: number[],
): Promise<Pick<ReportRow, 'listingId' | 'reason' | 'words' | 'createdAt'>[]> {
  if (listingIds.length === 0) return []
  const { listingId, id } = listingReport
  const ranked = db()
    .select({
      id,
      listingId,
      reason: listingReport.reason,
      words: listingReport.words,
      createdAt: listingReport.createdAt,
      place: sql<number>`row_number() over (partition by ${listingId} order by ${id} desc)`.as('place'),
    })
    .from(listingReport)
    .where(and(isOpen, inArray(listingId, listingIds)))
    .as('ranked')
  return db()
    .select({
      listingId: ranked.listingId,
      reason: ranked.reason,
      words: ranked.words,
      createdAt: ranked.createdAt,
    })
    .from(ranked)
    .where(lte(ranked.place, MOST_SHOWN))
    .orderBy(desc(ranked.id))
}

/** Why listings went off sale, by listing. */
export async function listTakenDown(
  listingIds: number[],
): Promise<Map<number, { reason: string; note: string | null }>> {
  if (listingIds.length === 0) return new Map()
  const rows = await db()
    .select({
      listingId: listingReport.listingId,
      reason: listingReport.closingReason,
      note: listingReport.note,
    })
    .from(listingReport)
    .where(and(inArray(listingReport.listingId, listingIds), eq(listingReport.outcome, 'taken-down')))
    .orderBy(asc(listingReport.id))
  return new Map(rows.map(({ listingId, reason, note }) => [listingId, { reason: reason ?? '', note }]))
}
