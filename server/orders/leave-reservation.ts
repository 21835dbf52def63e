import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { letMoneyGo } from '@/server/orders/let-money-go'
import { orderSeenBy } from '@/server/orders/party-of'
import { showAgain } from '@/server/orders/show-order'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

/** E03: the buyer gives up an unpaid hold. */
export async function leaveReservation(
  caller: Caller,
  orderId: string,
  commandId: string,
): Promise<ShownOrder> {
  return leave(caller, orderId, { edge: 'E03', commandId })
}

/** A buyer's way out before the seller has accepted: E03 unpaid, E10 with the deposit only earmarked. */
export async function leave(
  caller: Caller,
  orderId: string,
  by: { edge: 'E03' | 'E10'; commandId: string },
): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'buyer') throw new Problem('not-found')
  if (seen.order.acceptedAt !== null && seen.order.state === 'requested') {
    throw new Problem('order-moved', 'The seller has just accepted; the deposit is being taken.')
  }
  await inTransaction(async (tx) => {
    const { order, applied } = await applyEdge(tx, {
      ...by,
      orderId: seen.order.id,
      actor: 'buyer',
      actorId: caller.memberId,
    })
    if (applied) await letMoneyGo(tx, order)
  })
  return showAgain(seen)
}
