import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { mayAct } from '@/server/orders/order-policy'
import { orderSeenBy } from '@/server/orders/party-of'
import { showAgain } from '@/server/orders/show-order'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

/** E22: the animals are graded, counted and waiting for the window. */
export async function markReady(caller: Caller, orderId: string, commandId: string): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'seller') throw new Problem('not-found')
  if (seen.order.state === 'scheduled' && !mayAct('mark-ready', seen.order, 'seller')) {
    throw new Problem('balance-unpaid', 'The buyer pays the balance before the day; it has not come yet.')
  }
  await inTransaction((tx) =>
    applyEdge(tx, {
      edge: 'E22',
      orderId: seen.order.id,
      commandId,
      actor: 'seller',
      actorId: caller.memberId,
    }),
  )
  return showAgain(seen)
}
