import { timingSafeEqual } from 'node:crypto'

import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { refundOrder } from '@/server/money/refund-order'
import { applyEdge } from '@/server/orders/apply-edge'
import { mayAct } from '@/server/orders/order-policy'
import { changeOrder, lockOrder, type OrderRow } from '@/server/orders/order-store'
import { paidUnitCents } from '@/server/orders/paid-unit'
import { orderSeenBy } from '@/server/orders/party-of'
import { showAgain } from '@/server/orders/show-order'
import { moveStock } from '@/server/orders/stock-store'
import { openSurvival } from '@/server/ratings/open-survival'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'
import { shortfallRefund } from '@/shared/domain/money/shortfall-refund'

type Asked = ParsedBody<Endpoints['handOver']> & { commandId: string }

/** Guesses at a six-digit code before it is closed for good and staff must look. House rule. */
const MOST_CODE_TRIES = 10

const sameCode = (given: string, kept: string) =>
  given.length === kept.length && timingSafeEqual(Buffer.from(given), Buffer.from(kept))

/**
 * Judges one guess under the order's lock, so that many at once are still counted one by one, and in a transaction of
 * its own, so that the refusal cannot roll the count back.
 */
async function checkCode(orderId: number, code: string): Promise<void> {
  const isRight = await inTransaction(async (tx) => {
    const order = await lockOrder(tx, orderId)
    if (!order) throw new Problem('not-found')
    if (order.codeTries >= MOST_CODE_TRIES) {
      throw new Problem('code-wrong', 'Too many wrong codes. Write to our moderators; nothing is lost.')
    }
    if (sameCode(code, order.handOverCode)) return true
    await changeOrder(tx, order, { codeTries: order.codeTries + 1, updatedAt: now() })
    return false
  })
  if (isRight) return
  throw new Problem(
    'code-wrong',
    'That is not the code on the buyer’s screen. Ask them to read it once more.',
  )
}

/** Fewer handed over than ordered: the part is refunded at the price paid, and the fee falls with it. */
async function refundShort(tx: Tx, order: OrderRow, count: number): Promise<void> {
  await moveStock(tx, {
    listingId: order.listingId,
    orderId: order.id,
    reason: 'short-at-hand-over',
    quantity: order.quantity - count,
    moves: [['sold', -1]],
    by: null,
    at: now(),
  })
  const short = shortfallRefund({
    ordered: order.quantity,
    alive: count,
    price: { kind: 'each', unitCents: paidUnitCents(order) },
    boxCents: order.boxCents,
    freightCents: order.freightCents,
    isSellersFault: false,
    promisesFreight: false,
  })
  await refundOrder(tx, order, { amountCents: short.refundCents, why: 'short-at-hand-over' })
}

/**
 * E30: the seller enters the code the buyer gives last, and the count both saw. Overcount costs nothing; what is
 * missing goes back to the buyer at once. The animals that stayed behind return to the free count by the seller's
 * own recount, never by guess.
 */
export async function handOver(caller: Caller, orderId: string, asked: Asked): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'seller') throw new Problem('not-found')
  if (seen.order.handOver === 'ship') {
    throw new Problem(
      'order-moved',
      'This order is shipped: it goes to the carrier, and no code is asked for.',
    )
  }
  if (seen.order.state === 'ready' && !mayAct('hand-over', seen.order, 'seller')) {
    throw new Problem(
      'balance-unpaid',
      'The buyer pays the balance on their phone first; then the code appears.',
    )
  }
  if (seen.order.state === 'ready') await checkCode(seen.order.id, asked.code)
  await inTransaction(async (tx) => {
    const { order, applied } = await applyEdge(tx, {
      edge: 'E30',
      orderId: seen.order.id,
      commandId: asked.commandId,
      actor: 'seller',
      actorId: caller.memberId,
      facts: { count: asked.count },
      change: { countHandedOver: asked.count, handedOverAt: now() },
      quantity: Math.min(asked.count, seen.order.quantity),
    })
    if (applied) await openSurvival(tx, order)
    if (applied && asked.count < order.quantity) await refundShort(tx, order, asked.count)
  })
  return showAgain(seen)
}
