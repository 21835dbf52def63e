import type { Caller } from '@/server/http/caller'
import { leave } from '@/server/orders/leave-reservation'
import type { ShownOrder } from '@/shared/contracts/orders'

/** E10: the buyer changes their mind before the seller answers; nothing was taken. */
export async function withdrawRequest(
  caller: Caller,
  orderId: string,
  commandId: string,
): Promise<ShownOrder> {
  return leave(caller, orderId, { edge: 'E10', commandId })
}
