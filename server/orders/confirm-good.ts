import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { settleOrder } from '@/server/money/settle-order'
import { orderSeenBy } from '@/server/orders/party-of'
import { showAgain } from '@/server/orders/show-order'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

/** E40, or E38 of a shipped order, by the buyer: all is good, the money goes to the seller now rather than at the window's end. */
export async function confirmGood(caller: Caller, orderId: string, commandId: string): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'buyer') throw new Problem('not-found')
  await inTransaction((tx) =>
    settleOrder(tx, {
      edge: seen.order.handOver === 'ship' ? 'E38' : 'E40',
      orderId: seen.order.id,
      commandId,
      actor: 'buyer',
      actorId: caller.memberId,
    }),
  )
  return showAgain(seen)
}
