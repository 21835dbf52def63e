import { and, asc, eq, gt, inArray, lte } from 'drizzle-orm'

import { db } from '@/db/client'
import { order } from '@/db/schema/orders'
import type { OrderRow } from '@/server/orders/order-store'

export const REMINDED_STATES = ['scheduled', 'ready']

/** Agreed pickups that begin after `from` and not after `until`, soonest first. */
export async function listPickups(from: Date, until: Date): Promise<OrderRow[]> {
  return db()
    .select()
    .from(order)
    .where(
      and(
        inArray(order.state, REMINDED_STATES),
        gt(order.slotStartsAt, from),
        lte(order.slotStartsAt, until),
        eq(order.freeze, 'none'),
      ),
    )
    .orderBy(asc(order.slotStartsAt))
}
