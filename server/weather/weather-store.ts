import { and, asc, desc, eq, gt, inArray, lte } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { order } from '@/db/schema/orders'
import { routeCheck, shipment } from '@/db/schema/shipments'
import type { OrderRow } from '@/server/orders/order-store'

export type RouteCheckRow = typeof routeCheck.$inferSelect
export type RouteCheckKind = 'reservation' | 'evening' | 'morning' | 'seller'

const BEFORE_DISPATCH = ['scheduled', 'weather_hold', 'ready']

export async function insertRouteCheck(tx: Tx, row: typeof routeCheck.$inferInsert): Promise<void> {
  await tx.insert(routeCheck).values(row)
}

/** Every check of these orders, oldest first. */
export async function listChecksOf(orderIds: number[], tx: Tx = db()): Promise<RouteCheckRow[]> {
  if (orderIds.length === 0) return []
  return tx.select().from(routeCheck).where(inArray(routeCheck.orderId, orderIds)).orderBy(asc(routeCheck.id))
}

export async function readLastCheck(tx: Tx, orderId: number): Promise<RouteCheckRow | undefined> {
  const [row] = await tx
    .select()
    .from(routeCheck)
    .where(eq(routeCheck.orderId, orderId))
    .orderBy(desc(routeCheck.id))
    .limit(1)
  return row
}

/** Boxes that leave soon: their day begins before `until` and is not over at `at`. Read along the slot's index. */
export async function listLeavingSoon(at: Date, until: Date, most: number): Promise<OrderRow[]> {
  const rows = await db()
    .select({ order })
    .from(order)
    .innerJoin(shipment, eq(shipment.orderId, order.id))
    .where(
      and(
        inArray(order.state, ['scheduled', 'ready']),
        lte(order.slotStartsAt, until),
        gt(order.slotEndsAt, at),
        eq(order.freeze, 'none'),
      ),
    )
    .orderBy(asc(order.slotStartsAt))
    .limit(most)
  return rows.map((row) => row.order)
}

/** What a seller has still to ship, soonest first. */
export async function listToShip(sellerId: number, most: number): Promise<OrderRow[]> {
  const rows = await db()
    .select({ order })
    .from(order)
    .innerJoin(shipment, eq(shipment.orderId, order.id))
    .where(and(eq(order.sellerId, sellerId), inArray(order.state, BEFORE_DISPATCH)))
    .orderBy(asc(shipment.shipDay), asc(order.id))
    .limit(most)
  return rows.map((row) => row.order)
}
