import { and, count, desc, eq, inArray, isNull, lt } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listing } from '@/db/schema/listings'
import { notice } from '@/db/schema/notices'
import { order } from '@/db/schema/orders'
import { errnoOf } from '@/db/transaction'

const DUPLICATE = 1062
/** Where counting stops. */
const MOST_COUNTED = 100

export type NoticeRow = typeof notice.$inferSelect & {
  orderPublicId: string | null
  listingPublicId: string | null
}

/** False when this member was told of this cause before. */
export async function insertNotice(tx: Tx, row: typeof notice.$inferInsert): Promise<boolean> {
  try {
    await tx.insert(notice).values(row)
    return true
  } catch (error) {
    if (errnoOf(error) === DUPLICATE) return false
    throw error
  }
}

export async function listNoticeRows(page: {
  memberId: string
  beforeId?: number | undefined
  limit: number
}): Promise<NoticeRow[]> {
  const rows = await db()
    .select({ notice, orderPublicId: order.publicId, listingPublicId: listing.publicId })
    .from(notice)
    .leftJoin(order, eq(order.id, notice.orderId))
    .leftJoin(listing, eq(listing.id, notice.listingId))
    .where(
      and(
        eq(notice.memberId, page.memberId),
        page.beforeId === undefined ? undefined : lt(notice.id, page.beforeId),
      ),
    )
    .orderBy(desc(notice.id))
    .limit(page.limit)
  return rows.map(({ notice: row, ...about }) => ({ ...row, ...about }))
}

export async function countUnread(memberId: string): Promise<number> {
  const first = db()
    .select({ id: notice.id })
    .from(notice)
    .where(and(eq(notice.memberId, memberId), isNull(notice.readAt)))
    .limit(MOST_COUNTED)
    .as('first')
  const [row] = await db().select({ unread: count() }).from(first)
  return row?.unread ?? 0
}

/** False when there is no such notice of this member; one that was read before keeps its time. */
export async function markRead(own: { memberId: string; publicId: string }, at: Date): Promise<boolean> {
  const mine = and(eq(notice.publicId, own.publicId), eq(notice.memberId, own.memberId))
  await db()
    .update(notice)
    .set({ readAt: at })
    .where(and(mine, isNull(notice.readAt)))
  return (await db().$count(notice, mine)) === 1
}

export async function markAllRead(memberId: string, at: Date): Promise<void> {
  await db()
    .update(notice)
    .set({ readAt: at })
    .where(and(eq(notice.memberId, memberId), isNull(notice.readAt)))
}

/** Which of these causes were told already, as `cause member`. */
export async function listTold(causes: string[]): Promise<Set<string>> {
  if (causes.length === 0) return new Set()
  const rows = await db()
    .select({ cause: notice.cause, memberId: notice.memberId })
    .from(notice)
    .where(inArray(notice.cause, causes))
  return new Set(rows.map((row) => `${row.cause} ${row.memberId}`))
}
