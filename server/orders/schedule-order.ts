import type { Tx } from '@/db/transaction'
import { applyEdge } from '@/server/orders/apply-edge'
import { dayFollows } from '@/server/orders/day-follows'
import { lockOrder, type OrderRow } from '@/server/orders/order-store'
import { readShipment } from '@/server/orders/shipment-store'

async function dayOfOrder(tx: Tx, order: OrderRow): Promise<string> {
  if (order.windowId !== null) return `slot:${order.windowId}`
  const shipment = await readShipment(tx, order.id)
  return `ship:${shipment?.shipDay ?? ''}`
}

/** E14 in the same breath as E05 or E07, when the buyer chose a pickup window or a ship day while reserving. */
export async function scheduleOrder(tx: Tx, orderId: number): Promise<void> {
  const order = await lockOrder(tx, orderId)
  if (!order || order.state !== 'deposit_paid' || !dayFollows(order)) return
  await applyEdge(tx, {
    edge: 'E14',
    orderId,
    commandId: `${await dayOfOrder(tx, order)}:${order.version}`,
    actor: 'both',
  })
}
