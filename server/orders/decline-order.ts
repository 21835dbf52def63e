import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { letMoneyGo } from '@/server/orders/let-money-go'
import { applyEdge } from '@/server/orders/apply-edge'
import { mayAct } from '@/server/orders/order-policy'
import { orderSeenBy } from '@/server/orders/party-of'
import { markAnswered } from '@/server/orders/party-store'
import { showAgain } from '@/server/orders/show-order'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'

type Asked = ParsedBody<Endpoints['declineOrder']> & { commandId: string }

/** E08: the seller declines with a reason; the earmarked deposit is let go and the fish are free again. */
export async function declineOrder(caller: Caller, orderId: string, asked: Asked): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'seller') throw new Problem('not-found')
  if (seen.order.state === 'requested' && !mayAct('decline', seen.order, 'seller'))
    throw new Problem('order-moved')
  await inTransaction(async (tx) => {
    const { order, applied } = await applyEdge(tx, {
      edge: 'E08',
      orderId: seen.order.id,
      commandId: asked.commandId,
      actor: 'seller',
      actorId: caller.memberId,
      note: asked.note,
      facts: { why: asked.reason },
    })
    if (!applied) return
    await letMoneyGo(tx, order)
    await markAnswered(tx, order.sellerId)
  })
  return showAgain(seen)
}
