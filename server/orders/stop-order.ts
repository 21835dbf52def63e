import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { writeAudit } from '@/server/moderation/audit-store'
import { applyEdge } from '@/server/orders/apply-edge'
import { mayAct } from '@/server/orders/order-policy'
import { orderSeenBy } from '@/server/orders/party-of'
import { refundEverything } from '@/server/orders/refund-everything'
import { showAgain } from '@/server/orders/show-order'
import { moveStock } from '@/server/orders/stock-store'
import { now } from '@/server/clock'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'

type Asked = ParsedBody<Endpoints['stopOrder']> & { commandId: string }

const stops: Record<string, EdgeId> = {
  requested: 'E43',
  deposit_paid: 'E45',
  scheduled: 'E46',
  weather_hold: 'E47',
  ready: 'E48',
}

/** E43, E45 to E48: a moderator ends the order, the buyer gets every cent, the animals go free only if said so. */
export async function stopOrder(caller: Caller, orderId: string, asked: Asked): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'staff')
    throw new Problem('not-allowed', 'You are a party of this order: another moderator decides.')
  const edge = stops[seen.order.state]
  if (!edge || !mayAct('stop', seen.order, 'staff')) {
    throw new Problem('order-moved', undefined, { facts: { state: seen.order.state } })
  }
  await inTransaction(async (tx) => {
    const { order, applied } = await applyEdge(tx, {
      edge,
      orderId: seen.order.id,
      commandId: asked.commandId,
      actor: 'admin',
      actorId: caller.memberId,
      note: asked.note,
      facts: { cause: asked.cause },
    })
    if (!applied) return
    if (asked.animals === 'free') {
      await moveStock(tx, {
        listingId: order.listingId,
        orderId: order.id,
        reason: 'freed-after-stop',
        quantity: order.quantity,
        moves: [['free', 1]],
        by: caller.memberId,
        at: now(),
      })
    }
    await refundEverything(tx, order, 'stopped')
    await writeAudit(
      {
        actorId: caller.memberId,
        act: 'order-stopped',
        subject: `order:${order.publicId}`,
        facts: { cause: asked.cause, animals: asked.animals, note: asked.note },
        at: now(),
      },
      tx,
    )
  })
  return showAgain(seen)
}
