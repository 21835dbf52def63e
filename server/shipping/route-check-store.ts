import { and, desc, eq, inArray, max } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { routeCheck } from '@/db/schema/shipments'
import type { RouteCheckRow } from '@/server/weather/weather-store'

/** The last check that was made of an order for this ship day. */
export async function readLatestCheck(
  tx: Tx,
  orderId: number,
  shipDay: string,
): Promise<RouteCheckRow | undefined> {
  const [row] = await tx
    .select()
    .from(routeCheck)
    .where(and(eq(routeCheck.orderId, orderId), eq(routeCheck.shipDay, shipDay)))
    .orderBy(desc(routeCheck.id))
    .limit(1)
  return row
}

/** The last check of each of these orders, whatever the day it was made for. */
export async function listLatestChecks(orderIds: number[], tx: Tx = db()): Promise<RouteCheckRow[]> {
  if (orderIds.length === 0) return []
  const latest = tx
    .select({ id: max(routeCheck.id) })
    .from(routeCheck)
    .where(inArray(routeCheck.orderId, orderIds))
    .groupBy(routeCheck.orderId)
  return tx.select().from(routeCheck).where(inArray(routeCheck.id, latest))
}
