import { and, asc, eq, gt, inArray, lte, ne } from 'drizzle-orm'

import { db } from '@/db/client'
import { order } from '@/db/schema/orders'
import { shipment } from '@/db/schema/shipments'
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
        ne(order.handOver, 'ship'),
        gt(order.slotStartsAt, from),
        lte(order.slotStartsAt, until),
        eq(order.freeze, 'none'),
      ),
    )
    .orderBy(asc(order.slotStartsAt))
}

export interface BoxOnTheWay {
  order: OrderRow
  promisedAt: Date
  toZone: string
}

const boxColumns = { order, promisedAt: shipment.promisedAt, toZone: shipment.toZone }

/** Boxes that leave after `from` and not after `until`. */
export async function listLeavingBoxes(from: Date, until: Date): Promise<BoxOnTheWay[]> {
  return db()
    .select(boxColumns)
    .from(order)
    .innerJoin(shipment, eq(shipment.orderId, order.id))
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

/** Boxes on their way whose promised time lies after `from` and not after `until`. */
export async function listArrivingBoxes(from: Date, until: Date): Promise<BoxOnTheWay[]> {
  return db()
    .select(boxColumns)
    .from(order)
    .innerJoin(shipment, eq(shipment.orderId, order.id))
    .where(
      and(
        eq(order.state, 'dispatched'),
        gt(shipment.promisedAt, from),
        lte(shipment.promisedAt, until),
        eq(order.freeze, 'none'),
      ),
    )
    .orderBy(asc(shipment.promisedAt))
}
