import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { clockAfter } from '@/server/orders/apply-edge'
import { mayAct } from '@/server/orders/order-policy'
import { changeOrder, hasCommand, lockOrder, writeEvent } from '@/server/orders/order-store'
import { orderSeenBy } from '@/server/orders/party-of'
import { queueNoShowLetter } from '@/server/orders/queue-no-show-letter'
import { showAgain } from '@/server/orders/show-order'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

/**
 * One party says the other did not come. Nothing moves yet: the other has a day to object; then the clock takes E31
 * (buyer absent) or E32 (seller absent).
 */
export async function reportNoShow(
  caller: Caller,
  orderId: string,
  asked: { note?: string; commandId: string },
): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  const { party } = seen
  if (party === 'staff') throw new Problem('not-allowed')
  await inTransaction(async (tx) => {
    const order = await lockOrder(tx, seen.order.id)
    if (!order) throw new Problem('not-found')
    if (await hasCommand(tx, order.id, asked.commandId)) return
    if (!mayAct('report-no-show', order, party)) {
      throw new Problem('order-moved', 'Wait until the pickup time and its grace are over.')
    }
    const at = now()
    const marked = { ...order, noShowBy: party, noShowAt: at }
    const clock = await clockAfter(tx, marked, at)
    await changeOrder(tx, order, { noShowBy: party, noShowAt: at, ...clock, updatedAt: at })
    await writeEvent(tx, {
      orderId: order.id,
      commandId: asked.commandId,
      edge: 'mark',
      fromState: order.state,
      toState: order.state,
      actor: party,
      actorId: caller.memberId,
      note: asked.note ?? null,
      facts: { marked: 'no-show' },
      at,
    })
    await queueNoShowLetter(tx, marked)
  })
  return showAgain(seen)
}
