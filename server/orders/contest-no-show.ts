import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { mayAct } from '@/server/orders/order-policy'
import { orderSeenBy } from '@/server/orders/party-of'
import { showAgain } from '@/server/orders/show-order'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

/** The one said to be absent objects: the hand-over is unclear (E33) and a moderator decides. */
export async function contestNoShow(
  caller: Caller,
  orderId: string,
  asked: { note: string; commandId: string },
): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party === 'staff') throw new Problem('not-allowed', 'Staff decide; the parties object.')
  if (seen.order.state === 'ready' && !mayAct('contest', seen.order, seen.party)) {
    throw new Problem('order-moved', 'There is nothing to object to.')
  }
  await inTransaction((tx) =>
    applyEdge(tx, {
      edge: 'E33',
      orderId: seen.order.id,
      commandId: asked.commandId,
      actor: seen.party === 'seller' ? 'seller' : 'buyer',
      actorId: caller.memberId,
      note: asked.note,
      facts: { contested: true },
      change: { claimType: 'handover_unclear', noShowBy: null, noShowAt: null },
    }),
  )
  return showAgain(seen)
}
