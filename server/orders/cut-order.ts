import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { changeFree } from '@/server/listings/batch-stock-store'
import { listPayments } from '@/server/money/payment-store'
import { refundOrder } from '@/server/money/refund-order'
import { applyEdge } from '@/server/orders/apply-edge'
import { bySeller } from '@/server/orders/cancel-order'
import { letMoneyGo } from '@/server/orders/let-money-go'
import { changeOrder, lockOrder, writeEvent, type OrderRow } from '@/server/orders/order-store'
import { paidUnitCents } from '@/server/orders/paid-unit'
import { markAnswered } from '@/server/orders/party-store'
import { queueCutLetter } from '@/server/orders/queue-cut-letter'
import { refundEverything } from '@/server/orders/refund-everything'
import { moveStock } from '@/server/orders/stock-store'
import { readTerms } from '@/server/orders/terms-store'
import { queueEffect } from '@/server/outbox/outbox-store'
import { Problem } from '@/shared/api/problem'
import { quoteTotals } from '@/shared/domain/money/quote-order'

export interface CutWanted {
  /** Units that are not there. */
  short: number
  by: string
  note: string | undefined
  commandId: string
}

export interface CutOrder {
  order: OrderRow
  /** Units of the shortfall that this order bears. */
  units: number
  left: number
  refundCents: number
}

const WHY = 'short-count'

/** Not answered yet: it ends whole and nothing was taken. What is left of it may be sold to others. */
async function declineWhole(tx: Tx, before: OrderRow, wanted: CutWanted): Promise<CutOrder> {
  const { short, by, note, commandId } = wanted
  const { order } = await applyEdge(tx, {
    ...{ edge: 'E08', orderId: before.id, commandId, actor: 'seller', actorId: by, facts: { why: WHY } },
    ...(note ? { note } : {}),
  })
  await letMoneyGo(tx, order)
  await markAnswered(tx, order.sellerId)
  const units = Math.min(short, order.quantity)
  const gone = { listingId: order.listingId, change: -units, reason: 'short-harvest', by, at: now() }
  await changeFree({ ...gone, commandId: `${commandId}:${order.id}` }, tx)
  return { order, units, left: 0, refundCents: 0 }
}

async function endWhole(tx: Tx, before: OrderRow, wanted: CutWanted): Promise<CutOrder> {
  const edge = bySeller[before.state]
  if (!edge) throw new Problem('order-moved', undefined, { facts: { state: before.state } })
  const { by, note, commandId } = wanted
  const { order } = await applyEdge(tx, {
    ...{ edge, orderId: before.id, commandId, actor: 'seller', actorId: by, facts: { why: WHY } },
    ...(note ? { note } : {}),
  })
  const refundCents = await refundEverything(tx, order, WHY)
  return { order, units: order.quantity, left: 0, refundCents }
}

/** What is not paid yet is not asked for; what was paid goes back. Fee and deposit follow what is left. */
async function splitValue(tx: Tx, order: OrderRow, valueCents: number) {
  const isOpen = order.balancePaidAt === null
  const fromBalanceCents = isOpen ? Math.min(order.balanceCents, valueCents) : 0
  const { depositPct } = await readTerms(tx, order.listingVersionId)
  const worthCents = paidUnitCents(order) * order.quantity - valueCents
  const { boxCents, freightCents, taxCents, feeBp } = order
  const left = quoteTotals(worthCents, {
    boxCents,
    freightCents,
    taxCents,
    feeBp,
    depositBp: depositPct * 100,
  })
  return {
    refundCents: valueCents - fromBalanceCents,
    change: {
      goodsCents: order.goodsCents - fromBalanceCents,
      totalCents: order.totalCents - fromBalanceCents,
      balanceCents: order.balanceCents - fromBalanceCents,
      cutFromBalanceCents: order.cutFromBalanceCents + fromBalanceCents,
      depositCents: Math.min(order.depositCents, left.depositCents),
      feeCents: left.feeCents,
    },
  }
}

async function cutPart(tx: Tx, order: OrderRow, wanted: CutWanted): Promise<CutOrder> {
  const { short: units, by, note, commandId } = wanted
  const at = now()
  const left = order.quantity - units
  const { refundCents, change } = await splitValue(tx, order, paidUnitCents(order) * units)
  const cut = { quantity: left, quantityCut: order.quantityCut + units, quantityCutAt: at }
  if (!(await changeOrder(tx, order, { ...cut, ...change, updatedAt: at }))) throw new Problem('order-moved')
  await moveStock(tx, {
    ...{ listingId: order.listingId, orderId: order.id, reason: 'short-harvest', quantity: units, by, at },
    moves: [['sold', -1]],
  })
  for (const payment of await listPayments(order.id, tx)) {
    // A page over the old balance is closed; the next one asks for what is left.
    if (payment.purpose === 'balance' && payment.status === 'open')
      await queueEffect({ kind: 'expire-checkout', ref: payment.id, body: {} }, tx)
  }
  if (refundCents > 0) await refundOrder(tx, order, { amountCents: refundCents, why: 'short-harvest' })
  await writeEvent(tx, {
    ...{ orderId: order.id, commandId, edge: 'mark', fromState: order.state, toState: order.state },
    ...{ actor: 'seller', actorId: by, note: note ?? null, at },
    facts: { marked: 'quantity-cut', units, left, refundCents },
  })
  const fresh = (await lockOrder(tx, order.id)) ?? order
  await queueCutLetter(tx, fresh, { units, refundCents })
  return { order: fresh, units, left, refundCents }
}

/** Somebody is paying this very moment, or staff are looking: no sum may move under their hands. */
function isMoving(order: OrderRow): boolean {
  const isPaying = order.state === 'reserved' || (order.state === 'requested' && order.acceptedAt !== null)
  return isPaying || order.state === 'pledged' || order.freeze !== 'none' || order.paymentDispute === 'open'
}

/** Takes what is short from one order, in part or whole, with its money, in the caller's transaction. */
export async function cutOrder(tx: Tx, order: OrderRow, wanted: CutWanted): Promise<CutOrder> {
  if (isMoving(order)) {
    throw new Problem(
      'order-moved',
      'A buyer of this listing is paying at this moment. Nothing was changed: pause the listing, wait 15 minutes and enter the count again.',
      { facts: { state: order.state } },
    )
  }
  if (order.state === 'requested') return declineWhole(tx, order, wanted)
  return wanted.short < order.quantity ? cutPart(tx, order, wanted) : endWhole(tx, order, wanted)
}
