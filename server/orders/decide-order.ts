import { inTransaction, type Tx } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { writeAudit } from '@/server/moderation/audit-store'
import { settleOrder } from '@/server/money/settle-order'
import { applyEdge, type EdgeCommand } from '@/server/orders/apply-edge'
import { keepDeposit } from '@/server/orders/keep-deposit'
import { mayAct } from '@/server/orders/order-policy'
import type { OrderRow } from '@/server/orders/order-store'
import { orderSeenBy } from '@/server/orders/party-of'
import { LATE_OUTCOMES, requireFitting } from '@/server/orders/fitting-outcome'
import { refundEverything } from '@/server/orders/refund-everything'
import { showAgain } from '@/server/orders/show-order'
import { moveStock } from '@/server/orders/stock-store'
import { now } from '@/server/clock'
import { openSurvival } from '@/server/ratings/open-survival'
import { projectListings } from '@/server/search/project-listings'
import { decideLateBox } from '@/server/shipping/decide-late-box'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'

type Asked = ParsedBody<Endpoints['decideOrder']> & { commandId: string }

interface Move {
  order: OrderRow
  by: string | null
  to: 'delivered' | 'free'
}

/** The machine leaves the animals of an unclear hand-over where they were; the decision says where they are. */
async function moveAnimals(tx: Tx, { order, by, to }: Move): Promise<void> {
  await moveStock(tx, {
    listingId: order.listingId,
    orderId: order.id,
    reason: to === 'free' ? 'not-handed-over' : 'handed-over-by-decision',
    quantity: order.quantity,
    moves: [
      ['sold', -1],
      [to, 1],
    ],
    by,
    at: now(),
  })
  await projectListings(tx, [order.listingId])
}

/** A hand-over that was decided counts from the end of its window. */
const handedOverAt = (order: OrderRow) => order.slotEndsAt ?? now()

async function carryOut(tx: Tx, command: EdgeCommand, { outcome, aliveCount }: Asked): Promise<void> {
  if (LATE_OUTCOMES.includes(outcome))
    return decideLateBox(tx, command, outcome === 'lost' ? null : (aliveCount ?? 0))
  if (outcome === 'handed-over') {
    const order = await settleOrder(tx, command)
    if (!order) return
    await moveAnimals(tx, { order, by: command.actorId ?? null, to: 'delivered' })
    await openSurvival(tx, order)
    return
  }
  const { order, applied } = await applyEdge(tx, command)
  if (!applied) return
  if (outcome === 'buyer-absent') await keepDeposit(tx, order, 'buyer-absent')
  else await refundEverything(tx, order, 'seller-absent')
  await moveAnimals(tx, { order, by: command.actorId ?? null, to: 'free' })
}

/** E41 by a moderator, for a hand-over the two parties do not agree on or a box that is late. */
export async function decideOrder(caller: Caller, orderId: string, asked: Asked): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'staff')
    throw new Problem('not-allowed', 'You are a party of this order: another moderator decides.')
  if (!mayAct('decide', seen.order, 'staff'))
    throw new Problem('order-moved', undefined, { facts: { state: seen.order.state } })
  requireFitting(seen.order, asked)
  const { outcome, aliveCount, note } = asked
  const said: Record<string, string | number> = { outcome }
  if (aliveCount !== undefined) said.aliveCount = aliveCount
  await inTransaction(async (tx) => {
    const command: EdgeCommand = {
      edge: 'E41',
      orderId: seen.order.id,
      commandId: asked.commandId,
      actor: 'admin',
      actorId: caller.memberId,
      note,
      facts: said,
      ...(outcome === 'handed-over' ? { change: { handedOverAt: handedOverAt(seen.order) } } : {}),
    }
    await carryOut(tx, command, asked)
    await writeAudit(
      {
        actorId: caller.memberId,
        act: 'order-decided',
        subject: `order:${seen.order.publicId}`,
        facts: { ...said, note },
        at: now(),
      },
      tx,
    )
  })
  return showAgain(seen)
}
