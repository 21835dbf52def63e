import type { Tx } from '@/db/transaction'
import { applyEdge } from '@/server/orders/apply-edge'
import { lockOrder } from '@/server/orders/order-store'

/** E14 in the same breath as E05 or E07, when the buyer chose a pickup window while reserving. */
export async function scheduleOrder(tx: Tx, orderId: number): Promise<void> {
  const order = await lockOrder(tx, orderId)
  if (!order || order.state !== 'deposit_paid' || order.windowId === null) return
  await applyEdge(tx, {
    edge: 'E14',
    orderId,
    commandId: `slot:${order.windowId}:${order.version}`,
    actor: 'both',
  })
}
