import { and, desc, eq, inArray, isNull } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { weatherHold } from '@/db/schema/shipments'

export type HoldRow = typeof weatherHold.$inferSelect
export type HoldAnswer = 'agreed' | 'silence' | 'declined' | 'no-consent' | 'cancelled'

export async function insertHold(tx: Tx, row: typeof weatherHold.$inferInsert): Promise<void> {
  await tx.insert(weatherHold).values(row)
}

/** The hold that waits for the buyer. */
export async function readOpenHold(tx: Tx, orderId: number): Promise<HoldRow | undefined> {
  const [row] = await tx
    .select()
    .from(weatherHold)
    .where(and(eq(weatherHold.orderId, orderId), isNull(weatherHold.answer)))
    .orderBy(desc(weatherHold.id))
  return row
}

/** All holds of these orders, oldest first. */
export async function listHoldsOf(orderIds: number[], tx: Tx = db()): Promise<HoldRow[]> {
  if (orderIds.length === 0) return []
  return tx.select().from(weatherHold).where(inArray(weatherHold.orderId, orderIds)).orderBy(weatherHold.id)
}

export async function answerHold(
  tx: Tx,
  holdId: number,
  given: { answer: HoldAnswer; answeredAt: Date },
): Promise<void> {
  await tx.update(weatherHold).set(given).where(eq(weatherHold.id, holdId))
}
