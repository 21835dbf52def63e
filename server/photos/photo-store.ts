import { and, eq, gte, inArray, ne, sum } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { photo } from '@/db/schema/photos'

export type PhotoRow = typeof photo.$inferSelect

export async function insertPhoto(row: PhotoRow): Promise<void> {
  await db().insert(photo).values(row)
}

export async function findPhotos(ids: string[], tx: Tx = db()): Promise<PhotoRow[]> {
  return ids.length === 0 ? [] : tx.select().from(photo).where(inArray(photo.id, ids))
}

/** Bytes a member has uploaded since then. */
export async function sumUploaded(memberId: string, since: Date): Promise<number> {
  const [row] = await db()
    .select({ bytes: sum(photo.bytes) })
    .from(photo)
    .where(and(eq(photo.memberId, memberId), gte(photo.createdAt, since)))
  return Number(row?.bytes ?? 0)
}

/** Photos of other members that look exactly like one of these. */
export async function findTwinsElsewhere(
  looks: string[],
  memberId: string,
  tx: Tx = db(),
): Promise<{ looksLike: string; memberId: string }[]> {
  if (looks.length === 0) return []
  return tx
    .select({ looksLike: photo.looksLike, memberId: photo.memberId })
    .from(photo)
    .where(and(inArray(photo.looksLike, looks), ne(photo.memberId, memberId)))
    .limit(20)
}
