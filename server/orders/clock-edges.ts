import { inTransaction } from '@/db/transaction'
import { endHold } from '@/server/orders/end-hold'
import { applyEdge } from '@/server/orders/apply-edge'
import { letMoneyGo } from '@/server/orders/let-money-go'
import { markAnswerMissed } from '@/server/orders/party-store'
import type { OrderRow } from '@/server/orders/order-store'
import { settleOrder } from '@/server/money/settle-order'

type ClockEdge = (order: OrderRow) => Promise<void>

/** A timer's command id: the same ring twice changes nothing. */
const ringOf = (edge: string, order: OrderRow) => `clock:${edge}:${order.clockAt?.getTime() ?? 0}`

/** E09: the seller did not answer in time. One who has accepted is waiting for the processor, not for themselves. */
async function sellerSilent(order: OrderRow): Promise<void> {
  if (order.acceptedAt !== null) return
  await inTransaction(async (tx) => {
    const outcome = await applyEdge(tx, {
      edge: 'E09',
      orderId: order.id,
      commandId: ringOf('E09', order),
      actor: 'timer',
    })
    if (!outcome.applied) return
    await letMoneyGo(tx, outcome.order)
    await markAnswerMissed(tx, order.sellerId)
  })
}

/** E40: the claim window ended without a word: the money goes to the seller. */
async function windowEnded(order: OrderRow): Promise<void> {
  await inTransaction((tx) =>
    settleOrder(tx, { edge: 'E40', orderId: order.id, commandId: ringOf('E40', order), actor: 'timer' }),
  )
}

/** What happens when a clock rings, by the edge it tries. */
export const clockEdges: Record<string, ClockEdge> = {
  E02: (order) => endHold(order, ringOf('E02', order)),
  E09: sellerSilent,
  E40: windowEnded,
}
