import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { freeCancelUntil } from '@/server/orders/free-cancel-until'
import { buyerCancelled } from '@/server/orders/letters/ended-letters'
import { keepDeposit } from '@/server/orders/keep-deposit'
import { mayAct } from '@/server/orders/order-policy'
import type { OrderRow } from '@/server/orders/order-store'
import { orderSeenBy } from '@/server/orders/party-of'
import { queueLettersOf } from '@/server/orders/queue-order-letters'
import { refundEverything } from '@/server/orders/refund-everything'
import { showAgain } from '@/server/orders/show-order'
import { readTerms } from '@/server/orders/terms-store'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'

type Asked = ParsedBody<Endpoints['cancelOrder']> & { commandId: string }

const byBuyer: Record<string, EdgeId> = { deposit_paid: 'E15', scheduled: 'E24', ready: 'E56' }
/** How a seller ends an order, by its state. */
export const bySeller: Record<string, EdgeId> = {
  deposit_paid: 'E16',
  scheduled: 'E25',
  weather_hold: 'E54',
  ready: 'E55',
}

/**
 * Inside the free time that was promised at payment a buyer gets all back, even when the seller has the animals ready
 * early: else a press weeks ahead would take the promise away. After it the deposit may be kept. Returns the cents
 * that go back.
 */
async function settleBuyersCancel(tx: Tx, before: OrderRow, order: OrderRow): Promise<number> {
  const until = freeCancelUntil(before, await readTerms(tx, before.listingVersionId))
  const isFree = until === null || now() <= until
  return isFree ? refundEverything(tx, order, 'buyer-cancelled') : keepDeposit(tx, order, 'buyer-cancelled')
}

/** E15, E24, E56 by the buyer; E16, E25, E54, E55 by the seller, who says why and never costs the buyer a cent. */
export async function cancelOrder(caller: Caller, orderId: string, asked: Asked): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party === 'staff') throw new Problem('not-allowed', 'Staff stop an order; they do not cancel it.')
  const isBuyer = seen.party === 'buyer'
  if (!isBuyer && !asked.reason) {
    throw new Problem('fields-invalid', undefined, {
      errors: [{ detail: 'Say why: the buyer will read it.', pointer: '#/reason' }],
    })
  }
  await inTransaction(async (tx) => {
    const edge = (isBuyer ? byBuyer : bySeller)[seen.order.state]
    if (!edge || !mayAct('cancel', seen.order, seen.party)) {
      throw new Problem('order-moved', undefined, { facts: { state: seen.order.state } })
    }
    const { order, applied } = await applyEdge(tx, {
      edge,
      orderId: seen.order.id,
      commandId: asked.commandId,
      actor: isBuyer ? 'buyer' : 'seller',
      actorId: caller.memberId,
      note: asked.note,
      facts: asked.reason ? { why: asked.reason } : {},
    })
    if (!applied) return
    if (isBuyer) {
      const backCents = await settleBuyersCancel(tx, seen.order, order)
      await queueLettersOf(tx, { edge, order, write: buyerCancelled(backCents) })
    }
    if (!isBuyer) await refundEverything(tx, order, 'seller-cancelled')
  })
  return showAgain(seen)
}
