import type { Caller } from '@/server/http/caller'
import { openFor } from '@/server/orders/pay-deposit'
import type { ShownOrder } from '@/shared/contracts/orders'

/** The payment page for the rest, on the buyer's phone before the code is shown. */
export async function payBalance(caller: Caller, orderId: string): Promise<ShownOrder> {
  return openFor(caller, orderId, 'balance')
}
