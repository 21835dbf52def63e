import { and, asc, eq, gt, inArray, isNotNull, isNull, lte, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { order } from '@/db/schema/orders'
import { survival } from '@/db/schema/ratings'
import { seller } from '@/db/schema/sellers'

export type SurvivalRow = typeof survival.$inferSelect

export async function listSurvivalOf(orderIds: number[], tx: Tx = db()): Promise<SurvivalRow[]> {
  if (orderIds.length === 0) return []
  return tx.select().from(survival).where(inArray(survival.orderId, orderIds))
}

export async function lockSurvivalOf(tx: Tx, orderId: number): Promise<SurvivalRow | undefined> {
  const [row] = await tx.select().from(survival).where(eq(survival.orderId, orderId)).for('update')
  return row
}

export async function insertSurvival(tx: Tx, row: typeof survival.$inferInsert): Promise<void> {
  await tx.insert(survival).values(row)
}

export async function setSurvival(tx: Tx, orderId: number, change: Partial<SurvivalRow>): Promise<void> {
  await tx.update(survival).set(change).where(eq(survival.orderId, orderId))
}

/** Orders whose day 7 came since `from` and whose buyer was not asked. A frozen order waits. */
export async function listDueSurvival(
  { from, at }: { from: Date; at: Date },
  most: number,
): Promise<SurvivalRow[]> {
  const rows = await db()
    .select({ survival })
    .from(survival)
    .innerJoin(order, eq(order.id, survival.orderId))
    .where(
      and(
        isNull(survival.askedAt),
        gt(survival.dueAt, from),
        lte(survival.dueAt, at),
        eq(order.freeze, 'none'),
      ),
    )
    .orderBy(asc(survival.dueAt))
    .limit(most)
  return rows.map((row) => row.survival)
}

/** True for the one caller who may ask: the row says so before the mail is queued beside it. */
export async function markAsked(tx: Tx, orderId: number, at: Date): Promise<boolean> {
  const [done] = await tx
    .update(survival)
    .set({ askedAt: at })
    .where(and(eq(survival.orderId, orderId), isNull(survival.askedAt)))
  return done.affectedRows === 1
}

/** Counts the day-7 answers of a locked seller anew. */
export async function recountSurvival(tx: Tx, sellerId: number): Promise<void> {
  const own = eq(survival.sellerId, sellerId)
  const [asked] = await tx
    .select({ count: sql<string>`count(*)` })
    .from(survival)
    .where(and(own, isNotNull(survival.askedAt)))
  const [told] = await tx
    .select({
      count: sql<string>`count(*)`,
      handedOver: sql<string>`coalesce(sum(${survival.handedOver}), 0)`,
      alive: sql<string>`coalesce(sum(${survival.alive}), 0)`,
    })
    .from(survival)
    .where(and(own, isNotNull(survival.answeredAt)))
  await tx
    .update(seller)
    .set({
      survivalAsked: Number(asked?.count ?? 0),
      survivalAnswered: Number(told?.count ?? 0),
      survivalHandedOver: Number(told?.handedOver ?? 0),
      survivalAlive: Number(told?.alive ?? 0),
    })
    .where(eq(seller.id, sellerId))
}
