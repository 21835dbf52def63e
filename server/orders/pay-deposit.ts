import type { Caller } from '@/server/http/caller'
import { openPayment } from '@/server/money/open-payment'
import { mayAct } from '@/server/orders/order-policy'
import { orderSeenBy } from '@/server/orders/party-of'
import { showAgain } from '@/server/orders/show-order'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'

/** The payment page of a running hold: the one that is open, or a first one when the processor was away before. */
export async function payDeposit(caller: Caller, orderId: string): Promise<ShownOrder> {
  return openFor(caller, orderId, 'deposit')
}

export async function openFor(
  caller: Caller,
  orderId: string,
  purpose: 'deposit' | 'balance',
): Promise<ShownOrder> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'buyer') throw new Problem('not-found')
  if (!mayAct(purpose === 'deposit' ? 'pay-deposit' : 'pay-balance', seen.order, 'buyer')) {
    if (seen.order.reason === 'hold_expired') {
      throw new Problem(
        'deposit-expired',
        'The 15 minutes are over and what you held is free again. Hold them anew.',
      )
    }
    throw new Problem('order-moved', undefined, { facts: { state: seen.order.state } })
  }
  await openPayment(seen.order.id, purpose)
  const shown = await showAgain(seen)
  if (!shown.payUrl) {
    throw new Problem(
      'payments-away',
      'The payment service does not answer right now. What you chose is still held; try again in a moment.',
    )
  }
  return shown
}
