import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { projectListings } from '@/server/search/project-listings'
import { moveStock } from '@/server/orders/stock-store'
import {
  changeOrder,
  freeSlot,
  hasCommand,
  lockOrder,
  writeEvent,
  type OrderRow,
} from '@/server/orders/order-store'
import { closeHold } from '@/server/weather/close-hold'
import { readOpenHold } from '@/server/orders/hold-store'
import { readShipment } from '@/server/orders/shipment-store'
import { readTerms } from '@/server/orders/terms-store'
import { queueOrderLetters } from '@/server/orders/queue-order-letters'
import { Problem } from '@/shared/api/problem'
import { claimWindowHours } from '@/shared/domain/listings/claim-promise'
import { readyDay } from '@/shared/domain/listings/ready-day'
import { edges, type Edge, type EdgeActor, type EdgeId } from '@/shared/domain/orders/edges.facts'
import { nextClock } from '@/shared/domain/orders/next-clock'
import type { OrderState } from '@/shared/domain/orders/states.facts'

export interface EdgeCommand {
  edge: EdgeId
  orderId: number
  /** Repeating a command id changes nothing. */
  commandId: string
  actor: EdgeActor
  actorId?: string
  note?: string
  facts?: Record<string, string | number | boolean>
  /** Columns that change with the state. */
  change?: Partial<OrderRow>
  /** Animals that move with the edge; the order's whole quantity unless said otherwise. */
  quantity?: number
}

export interface EdgeOutcome {
  order: OrderRow
  /** False when this very command was applied before. */
  applied: boolean
}

const MONEY_STATES = new Set(['settled', 'cancelled', 'deposit_paid'])
const GOODS_STATES = new Set(['ready', 'dispatched', 'handed_over', 'settled'])

/**
 * Overlays stop edges: a freeze stops all, an open payment dispute whatever would move money, an open recall whatever
 * would give the goods out or pay for them. A recalled order can still be cancelled.
 */
function checkOverlays(order: OrderRow, to: string): void {
  if (order.freeze !== 'none')
    throw new Problem('order-moved', 'This order is frozen while staff look into it.')
  if (order.paymentDispute === 'open' && MONEY_STATES.has(to)) throw new Problem('dispute-open')
  if (order.recall === 'open' && GOODS_STATES.has(to))
    throw new Problem('order-moved', 'This batch is being recalled: nothing of it may be handed over now.')
}

/** A slot whose time has passed stays counted: it was used, if only by waiting. */
const isAhead = (order: OrderRow, at: Date) => order.slotStartsAt === null || order.slotStartsAt > at

/** The timer of the order as it will stand, counted from now. */
export async function clockAfter(
  tx: Tx,
  order: OrderRow,
  at: Date,
): Promise<{ clockAt: Date | null; clockEdge: string | null }> {
  const terms = await readTerms(tx, order.listingVersionId)
  const readyOn = readyDay(terms)
  const next = nextClock({
    state: order.state as OrderState,
    sinceMs: at.getTime(),
    category: terms.category,
    readyMs: readyOn ? Date.parse(`${readyOn}T23:59:59Z`) : null,
    slotStartMs: order.slotStartsAt?.getTime() ?? null,
    slotEndMs: order.slotEndsAt?.getTime() ?? null,
    balanceDue: order.balanceDue === 'before' ? 'before' : 'at-handover',
    isBalancePaid: order.balancePaidAt !== null || order.balanceCents === 0,
    claimWindowHours: claimWindowHours(terms),
    promisedDeliveryMs: (await readShipment(tx, order.id))?.promisedAt.getTime() ?? null,
    handOver: order.handOver === 'ship' ? 'ship' : 'pickup',
    silenceMoves: (await readOpenHold(tx, order.id))?.silenceMoves ?? false,
    noShow:
      order.noShowBy && order.noShowAt
        ? { by: order.noShowBy === 'buyer' ? 'buyer' : 'seller', sinceMs: order.noShowAt.getTime() }
        : null,
  })
  return { clockAt: next ? new Date(next.atMs) : null, clockEdge: next?.edge ?? null }
}

/**
 * Applies one edge of the order machine inside the caller's transaction: state and version checked, stock moved with
 * its ledger row, the slot given back when the order ends early, the next clock set, the event written, mails queued.
 */
export async function applyEdge(tx: Tx, command: EdgeCommand): Promise<EdgeOutcome> {
  const edge: Edge = edges[command.edge]
  const before = await lockOrder(tx, command.orderId)
  if (!before) throw new Problem('not-found')
  if (await hasCommand(tx, before.id, command.commandId)) return { order: before, applied: false }
  if (before.state !== edge.from)
    throw new Problem('order-moved', undefined, { facts: { state: before.state } })
  checkOverlays(before, edge.to)

  const at = now()
  const quantity = command.quantity ?? before.quantity
  const moved = { ...before, ...command.change, state: edge.to }
  const clock = await clockAfter(tx, moved, at)
  const change = { ...command.change, ...clock, state: edge.to, reason: edge.reason ?? null, updatedAt: at }
  if (!(await changeOrder(tx, before, change))) throw new Problem('order-moved')
  await moveStock(tx, {
    listingId: before.listingId,
    orderId: before.id,
    reason: command.edge,
    quantity,
    moves: edge.stock,
    by: command.actorId ?? null,
    at,
  })
  if (edge.from === 'weather_hold') {
    const { edge: id, actor } = command
    await closeHold(tx, { orderId: before.id, edge: id, actor, windowId: moved.windowId, at })
  }
  if (edge.to === 'cancelled' && before.windowId !== null && isAhead(before, at))
    await freeSlot(tx, before.windowId)
  await writeEvent(tx, {
    orderId: before.id,
    commandId: command.commandId,
    edge: command.edge,
    fromState: edge.from,
    toState: edge.to,
    actor: command.actor,
    actorId: command.actorId ?? null,
    note: command.note ?? null,
    facts: command.facts ?? {},
    at,
  })
  await projectListings(tx, [before.listingId])
  const order: OrderRow = { ...before, ...change, version: before.version + 1 }
  await queueOrderLetters(tx, command.edge, order)
  return { order, applied: true }
}
