import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { applyEdge } from '@/server/orders/apply-edge'
import { insertHold, listHoldsOf, readOpenHold } from '@/server/orders/hold-store'
import { findWindow, holdSlot, type OrderRow } from '@/server/orders/order-store'
import { queueLettersOf } from '@/server/orders/queue-order-letters'
import { shipSlot } from '@/server/shipping/ship-slot'
import { held } from '@/server/weather/weather-letters'
import { Problem } from '@/shared/api/problem'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'
import { silenceMoves } from '@/shared/domain/shipping/hold-rules'

export interface Holding {
  startedBy: 'system' | 'seller'
  actorId?: string
  commandId: string
  why: string
  /** A box: the day proposed. A pickup: the window. Neither: open-ended. */
  proposed: { shipDay?: string | undefined; windowId?: string | undefined }
}

interface Proposal {
  proposedStartsAt: Date | null
  proposedEndsAt: Date | null
  proposedShipDay: string | null
  proposedWindowId: number | null
}

const openEnded: Proposal = {
  proposedStartsAt: null,
  proposedEndsAt: null,
  proposedShipDay: null,
  proposedWindowId: null,
}

async function proposalOf(
  tx: Tx,
  order: OrderRow,
  { shipDay, windowId }: Holding['proposed'],
): Promise<Proposal> {
  if (shipDay) {
    const { slotStartsAt, slotEndsAt } = shipSlot(shipDay, order.zone)
    return {
      ...openEnded,
      proposedStartsAt: slotStartsAt,
      proposedEndsAt: slotEndsAt,
      proposedShipDay: shipDay,
    }
  }
  if (!windowId) return openEnded
  const window = await findWindow(tx, order.listingId, windowId)
  if (!window || window.startsAt <= now() || window.id === order.windowId) {
    throw new Problem('slot-full', 'That pickup time is not offered. Choose another.')
  }
  if (!(await holdSlot(tx, window.id)))
    throw new Problem('slot-full', 'That pickup time is full. Choose another.')
  return {
    ...openEnded,
    proposedStartsAt: window.startsAt,
    proposedEndsAt: window.endsAt,
    proposedWindowId: window.id,
  }
}

const edgeFrom: Partial<Record<string, EdgeId>> = { scheduled: 'E18', ready: 'E27' }

/**
 * E18, E27: the day is off. The hold row is written first, as the order's clock reads from it what silence will mean.
 * Give it the order as locked in this transaction.
 */
export async function holdOrder(tx: Tx, order: OrderRow, holding: Holding): Promise<void> {
  const edge = edgeFrom[order.state]
  if (!edge || !order.slotStartsAt)
    throw new Problem('order-moved', undefined, { facts: { state: order.state } })
  const at = now()
  const number = (await listHoldsOf([order.id], tx)).length + 1
  const proposal = await proposalOf(tx, order, holding.proposed)
  const proposedMs = proposal.proposedStartsAt?.getTime() ?? null
  await insertHold(tx, {
    orderId: order.id,
    number,
    startedBy: holding.startedBy,
    startedAt: at,
    why: holding.why,
    fromStartsAt: order.slotStartsAt,
    ...proposal,
    silenceMoves: silenceMoves({
      number,
      fromMs: order.slotStartsAt.getTime(),
      proposedMs,
      heldMs: at.getTime(),
    }),
  })
  const { order: after, applied } = await applyEdge(tx, {
    edge,
    orderId: order.id,
    commandId: holding.commandId,
    actor: holding.startedBy,
    ...(holding.actorId ? { actorId: holding.actorId } : {}),
    note: holding.why,
  })
  const hold = await readOpenHold(tx, order.id)
  if (applied && hold) await queueLettersOf(tx, { edge, order: after, write: held(hold) })
}
