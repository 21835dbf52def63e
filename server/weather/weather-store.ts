import { and, asc, eq, gt, inArray, lte, max, notExists, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { order } from '@/db/schema/orders'
import { routeCheck, shipment } from '@/db/schema/shipments'
import type { OrderRow } from '@/server/orders/order-store'
import { temperatureCheckHours } from '@/shared/domain/orders/clocks.facts'

export type RouteCheckRow = typeof routeCheck.$inferSelect
export type RouteCheckKind = 'reservation' | 'evening' | 'morning' | 'seller'

const BEFORE_DISPATCH = ['scheduled', 'weather_hold', 'ready']

export async function insertRouteCheck(tx: Tx, row: typeof routeCheck.$inferInsert): Promise<void> {
  await tx.insert(routeCheck).values(row)
}

/** The last check of each of these orders for the day now agreed. */
export async function listChecksOfDay(orderIds: number[]): Promise<RouteCheckRow[]> {
  if (orderIds.length === 0) return []
  const latest = db()
    .select({ id: max(routeCheck.id) })
    .from(routeCheck)
    .innerJoin(
      shipment,
      and(eq(shipment.orderId, routeCheck.orderId), eq(shipment.shipDay, routeCheck.shipDay)),
    )
    .where(inArray(routeCheck.orderId, orderIds))
    .groupBy(routeCheck.orderId)
  return db().select().from(routeCheck).where(inArray(routeCheck.id, latest))
}

export interface DueCheck {
  order: OrderRow
  kind: 'evening' | 'morning'
}

const HOUR_MS = 3_600_000
/** The slot of a box begins with its morning check. Clocks change on Sundays and no box leaves then: the evening is always so long before. */
export const EVENING_MS = (24 - temperatureCheckHours.dayBefore + temperatureCheckHours.dayOf) * HOUR_MS

/** Boxes whose evening or morning check is due and not made yet, soonest first. Read along the slot's index. */
export async function listDueChecks(at: Date, most: number): Promise<DueCheck[]> {
  const kind = sql<DueCheck['kind']>`if(${order.slotStartsAt} <= ${at}, 'morning', 'evening')`
  const made = db()
    .select({ id: routeCheck.id })
    .from(routeCheck)
    .where(
      and(
        eq(routeCheck.orderId, order.id),
        eq(routeCheck.shipDay, shipment.shipDay),
        sql`${routeCheck.kind} = ${kind}`,
      ),
    )
  return db()
    .select({ order, kind })
    .from(order)
    .innerJoin(shipment, eq(shipment.orderId, order.id))
    .where(
      and(
        inArray(order.state, ['scheduled', 'ready']),
        lte(order.slotStartsAt, new Date(at.getTime() + EVENING_MS)),
        gt(order.slotEndsAt, at),
        eq(order.freeze, 'none'),
        notExists(made),
      ),
    )
    .orderBy(asc(order.slotStartsAt), asc(order.id))
    .limit(most)
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
