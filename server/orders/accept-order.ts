import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { listPayments } from '@/server/money/payment-store'
import { mayAct } from '@/server/orders/order-policy'
import { changeOrder, lockOrder } from '@/server/orders/order-store'
import { orderSeenBy } from '@/server/orders/party-of'
import { markAnswered, readSellerById } from '@/server/orders/party-store'
import { showAgain } from '@/server/orders/show-order'
import { readTermsOf } from '@/server/orders/terms-store'
import { queueEffect } from '@/server/outbox/outbox-store'
import { runEffectNow } from '@/server/outbox/run-effects'
import { judgeListing } from '@/server/rules/judge-listing'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

/**
 * The seller accepts inside the clock, the legal gate checked again. The deposit is captured right after the commit;
 * E07 follows from the processor's word, so `deposit_paid` always means that the money is there.
 */
export async function acceptOrder(caller: Caller, orderId: string, commandId: string): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'seller') throw new Problem('not-found')
  await checkGateAgain(seen.order)
  const seq = await inTransaction(async (tx) => {
    const order = await lockOrder(tx, seen.order.id)
    if (!order) throw new Problem('not-found')
    if (order.acceptedAt !== null) return null
    if (!mayAct('accept', order, 'seller'))
      throw new Problem('order-moved', undefined, { facts: { state: order.state } })
    const payment = (await listPayments(order.id, tx)).findLast((row) => row.status === 'authorised')
    if (!payment) throw new Problem('order-moved', 'The deposit is no longer earmarked on the card.')
    const at = now()
    await changeOrder(tx, order, { acceptedAt: at, updatedAt: at })
    await markAnswered(tx, order.sellerId)
    return queueEffect({ kind: 'capture-deposit', ref: payment.id, body: { commandId } }, tx)
  })
  if (seq !== null) await runEffectNow(seq)
  return showAgain(seen)
}

async function checkGateAgain(order: Awaited<ReturnType<typeof orderSeenBy>>['order']): Promise<void> {
  const body = (await readTermsOf([order.listingVersionId])).get(order.listingVersionId)
  const seller = await readSellerById(order.sellerId)
  if (!body || !seller) throw new Problem('not-found')
  const { buyerState } = order
  const verdict = await judgeListing({ body, sellerState: seller.state, buyerState, viewer: 'seller' })
  if (verdict.buy === 'no') {
    throw new Problem(
      'species-prohibited',
      `A rule has changed: this species can no longer be sold to ${buyerState}. Decline the order; the buyer gets everything back.`,
    )
  }
}
