import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { findWindow, freeSlot, holdSlot, lockOrder, type OrderRow } from '@/server/orders/order-store'
import { mayAct, type Party } from '@/server/orders/order-policy'
import { orderSeenBy } from '@/server/orders/party-of'
import { showAgain } from '@/server/orders/show-order'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

interface Moving {
  caller: Caller
  party: Party
  windowId: string
  commandId: string
}

async function takeWindow(tx: Tx, order: OrderRow, windowId: string) {
  const window = await findWindow(tx, order.listingId, windowId)
  if (!window || window.startsAt <= now() || window.id === order.windowId) {
    throw new Problem('slot-full', 'That pickup time is not offered. Choose another.')
  }
  if (!(await holdSlot(tx, window.id)))
    throw new Problem('slot-full', 'That pickup time is full. Choose another.')
  if (order.windowId !== null) await freeSlot(tx, order.windowId)
  return {
    windowId: window.id,
    isDayBySilence: false,
    slotStartsAt: window.startsAt,
    slotEndsAt: window.endsAt,
    zone: window.zone,
  }
}

/** E14 for an order without a day; E28 moves a ready one back to `scheduled`, once for each side. */
async function move(tx: Tx, orderId: number, moving: Moving): Promise<void> {
  const order = await lockOrder(tx, orderId)
  if (!order || !mayAct('choose-slot', order, moving.party)) {
    throw new Problem('order-moved', 'The day can no longer be moved here. Write to the other party.')
  }
  const slot = await takeWindow(tx, order, moving.windowId)
  const moves =
    moving.party === 'buyer' ? { buyerMoves: order.buyerMoves + 1 } : { sellerMoves: order.sellerMoves + 1 }
  await applyEdge(tx, {
    edge: order.state === 'deposit_paid' ? 'E14' : 'E28',
    orderId,
    commandId: moving.commandId,
    actor: 'both',
    actorId: moving.caller.memberId,
    change: order.state === 'deposit_paid' ? slot : { ...slot, ...moves },
  })
}

export async function chooseSlot(
  caller: Caller,
  orderId: string,
  asked: { windowId: string; commandId: string },
): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party === 'staff') throw new Problem('not-allowed', 'The parties move the day between them.')
  await inTransaction((tx) => move(tx, seen.order.id, { caller, party: seen.party, ...asked }))
  return showAgain(seen)
}
