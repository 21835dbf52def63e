import { eq, inArray } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { shipment } from '@/db/schema/shipments'

export type ShipmentRow = typeof shipment.$inferSelect

export async function insertShipment(tx: Tx, row: typeof shipment.$inferInsert): Promise<void> {
  await tx.insert(shipment).values(row)
}

/** Undefined: the order is collected. */
export async function readShipment(tx: Tx, orderId: number): Promise<ShipmentRow | undefined> {
  const [row] = await tx.select().from(shipment).where(eq(shipment.orderId, orderId))
  return row
}

export async function listShipmentsOf(orderIds: number[], tx: Tx = db()): Promise<ShipmentRow[]> {
  if (orderIds.length === 0) return []
  return tx.select().from(shipment).where(inArray(shipment.orderId, orderIds))
}

export async function changeShipment(
  tx: Tx,
  orderId: number,
  change: Partial<Omit<ShipmentRow, 'orderId'>>,
): Promise<void> {
  await tx.update(shipment).set(change).where(eq(shipment.orderId, orderId))
}
