import {
  and,
  asc,
  desc,
  eq,
  gt,
  gte,
  inArray,
  isNotNull,
  isNull,
  lt,
  lte,
  ne,
  notInArray,
  or,
  sql,
} from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listing, pickupWindow } from '@/db/schema/listings'
import { order, orderEvent } from '@/db/schema/orders'
import { ruleEvidence } from '@/db/schema/rules'
import type { RuleEvidence } from '@/shared/contracts/rules'

export type OrderRow = typeof order.$inferSelect
export type OrderEventRow = typeof orderEvent.$inferSelect

const FINAL = ['settled', 'cancelled']
const TO_SERVE = ['reserved', 'requested', 'pledged', 'deposit_paid', 'scheduled', 'weather_hold', 'ready']

/**
 * Takes fish from the free count in one conditional update: true when they were there. Nothing is read first, so two
 * buyers of the last twenty cannot both have them.
 */
export async function holdFish(tx: Tx, listingId: number, quantity: number): Promise<boolean> {
  const [done] = await tx
    .update(listing)
    .set({ free: sql`${listing.free} - ${quantity}`, held: sql`${listing.held} + ${quantity}` })
    .where(and(eq(listing.id, listingId), eq(listing.state, 'live'), gte(listing.free, quantity)))
  return done.affectedRows === 1
}

export async function readFree(listingId: number, tx: Tx = db()): Promise<number> {
  const [row] = await tx.select({ free: listing.free }).from(listing).where(eq(listing.id, listingId))
  return row?.free ?? 0
}

/** One place in an open window, by the same kind of conditional update. */
export async function holdSlot(tx: Tx, windowId: number): Promise<boolean> {
  const [done] = await tx
    .update(pickupWindow)
    .set({ taken: sql`${pickupWindow.taken} + 1` })
    .where(
      and(
        eq(pickupWindow.id, windowId),
        eq(pickupWindow.closed, 0),
        lt(pickupWindow.taken, pickupWindow.capacity),
      ),
    )
  return done.affectedRows === 1
}

export async function freeSlot(tx: Tx, windowId: number): Promise<void> {
  await tx
    .update(pickupWindow)
    .set({ taken: sql`${pickupWindow.taken} - 1` })
    .where(and(eq(pickupWindow.id, windowId), sql`${pickupWindow.taken} > 0`))
}

export async function findWindow(tx: Tx, listingId: number, windowPublicId: string) {
  const [row] = await tx
    .select()
    .from(pickupWindow)
    .where(and(eq(pickupWindow.listingId, listingId), eq(pickupWindow.publicId, windowPublicId)))
  return row
}

export async function hasOpenWindow(tx: Tx, listingId: number, after: Date): Promise<boolean> {
  const [row] = await tx
    .select({ id: pickupWindow.id })
    .from(pickupWindow)
    .where(
      and(
        eq(pickupWindow.listingId, listingId),
        eq(pickupWindow.closed, 0),
        gt(pickupWindow.startsAt, after),
      ),
    )
    .limit(1)
  return row !== undefined
}

export async function insertOrder(tx: Tx, row: typeof order.$inferInsert): Promise<number> {
  const [made] = await tx.insert(order).values(row).$returningId()
  if (!made) throw new Error('the order row has no number')
  return made.id
}

export async function readOrder(publicId: string, tx: Tx = db()): Promise<OrderRow | undefined> {
  const [row] = await tx.select().from(order).where(eq(order.publicId, publicId))
  return row
}

export async function readOrderById(id: number, tx: Tx = db()): Promise<OrderRow | undefined> {
  const [row] = await tx.select().from(order).where(eq(order.id, id))
  return row
}

/** The row, locked until the transaction ends. */
export async function lockOrder(tx: Tx, id: number): Promise<OrderRow | undefined> {
  const [row] = await tx.select().from(order).where(eq(order.id, id)).for('update')
  return row
}

/** An order already made by this very command, when a request comes a second time after a crash. */
export async function findOrderByCommand(buyerId: string, commandId: string): Promise<OrderRow | undefined> {
  const [row] = await db()
    .select({ order })
    .from(orderEvent)
    .innerJoin(order, eq(order.id, orderEvent.orderId))
    .where(and(eq(order.buyerId, buyerId), eq(orderEvent.edge, 'E01'), eq(orderEvent.commandId, commandId)))
  return row?.order
}

export async function changeOrder(
  tx: Tx,
  at: { id: number; version: number },
  change: Partial<typeof order.$inferInsert>,
): Promise<boolean> {
  const [done] = await tx
    .update(order)
    .set({ ...change, version: at.version + 1 })
    .where(and(eq(order.id, at.id), eq(order.version, at.version)))
  return done.affectedRows === 1
}

export async function hasCommand(tx: Tx, orderId: number, commandId: string): Promise<boolean> {
  const found = await tx
    .select({ id: orderEvent.id })
    .from(orderEvent)
    .where(and(eq(orderEvent.orderId, orderId), eq(orderEvent.commandId, commandId)))
  return found.length > 0
}

export async function writeEvent(tx: Tx, row: typeof orderEvent.$inferInsert): Promise<void> {
  await tx.insert(orderEvent).values(row)
}

export async function listEventsOf(orderIds: number[], tx: Tx = db()): Promise<OrderEventRow[]> {
  if (orderIds.length === 0) return []
  return tx.select().from(orderEvent).where(inArray(orderEvent.orderId, orderIds)).orderBy(asc(orderEvent.id))
}

export async function countUnpaidHolds(tx: Tx, buyerId: string): Promise<number> {
  return tx.$count(order, and(eq(order.buyerId, buyerId), eq(order.state, 'reserved')))
}

/** Pickups a buyer has let pass since a moment. */
export async function countNoShows(tx: Tx, buyerId: string, since: Date): Promise<number> {
  return tx.$count(
    order,
    and(eq(order.buyerId, buyerId), eq(order.reason, 'buyer_no_show'), gte(order.noShowAt, since)),
  )
}

/** Running orders of a listing whose goods have not left yet, the last one made first; locked. */
export async function lockOrdersToServe(tx: Tx, listingId: number): Promise<OrderRow[]> {
  return tx
    .select()
    .from(order)
    .where(and(eq(order.listingId, listingId), inArray(order.state, TO_SERVE)))
    .orderBy(desc(order.createdAt), desc(order.id))
    .for('update')
}

/** Animals of one listing that a buyer has in orders still running or done. */
export async function countBought(tx: Tx, buyerId: string, listingId: number): Promise<number> {
  const [row] = await tx
    .select({ bought: sql<number>`coalesce(sum(${order.quantity}), 0)` })
    .from(order)
    .where(and(eq(order.buyerId, buyerId), eq(order.listingId, listingId), ne(order.state, 'cancelled')))
  return Number(row?.bought ?? 0)
}

export interface OrderPage {
  party: { buyerId: string } | { sellerId: number }
  show: 'open' | 'all'
  listingId?: number
  beforeId?: number
  limit: number
}

export async function listOrderRows(page: OrderPage): Promise<OrderRow[]> {
  const mine =
    'buyerId' in page.party ? eq(order.buyerId, page.party.buyerId) : eq(order.sellerId, page.party.sellerId)
  return db()
    .select()
    .from(order)
    .where(
      and(
        mine,
        page.show === 'open' ? notInArray(order.state, FINAL) : undefined,
        page.listingId === undefined ? undefined : eq(order.listingId, page.listingId),
        page.beforeId === undefined ? undefined : lt(order.id, page.beforeId),
      ),
    )
    .orderBy(desc(order.id))
    .limit(page.limit)
}

export interface DueOrders {
  at: Date
  edges: readonly string[]
  /** The last one of the look before. */
  after?: { id: number; clockAt: Date | null }
  most: number
}

/** Orders whose timer for one of these edges has rung and that nothing holds still, the oldest first. */
export function listDueOrders({ at, edges, after, most }: DueOrders) {
  return db()
    .select({ id: order.id, clockAt: order.clockAt, clockEdge: order.clockEdge })
    .from(order)
    .where(
      and(
        isNotNull(order.clockAt),
        lte(order.clockAt, at),
        after?.clockAt
          ? or(
              gt(order.clockAt, after.clockAt),
              and(eq(order.clockAt, after.clockAt), gt(order.id, after.id)),
            )
          : undefined,
        inArray(order.clockEdge, [...edges]),
        eq(order.freeze, 'none'),
        or(ne(order.paymentDispute, 'open'), isNull(order.paymentDispute)),
      ),
    )
    .orderBy(asc(order.clockAt), asc(order.id))
    .limit(most)
}

export async function writeEvidence(
  tx: Tx,
  row: { orderId: number; memberId: string; party: 'buyer' | 'seller'; shown: RuleEvidence; at: Date },
): Promise<void> {
  await tx.insert(ruleEvidence).values(row)
}

export async function readEvidence(orderIds: number[]): Promise<(typeof ruleEvidence.$inferSelect)[]> {
  if (orderIds.length === 0) return []
  return db().select().from(ruleEvidence).where(inArray(ruleEvidence.orderId, orderIds))
}
