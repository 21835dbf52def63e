import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { mayAct } from '@/server/orders/order-policy'
import { showAgain } from '@/server/orders/show-order'
import { orderShippedFor } from '@/server/shipping/order-shipped'
import { Problem } from '@/shared/api/problem'
import type { ShownOrder } from '@/shared/contracts/orders'
import { printMoment } from '@/shared/times/print-time'

/** E36 by the buyer, once the promised time is over. Carriers are late without a seller's doing: no mark on anybody. */
export async function reportLateBox(caller: Caller, orderId: string, commandId: string): Promise<ShownOrder> {
  const shipped = await orderShippedFor('buyer', caller, orderId)
  const { order, shipment } = shipped
  if (order.state === 'dispatched' && !mayAct('report-late-box', order, 'buyer')) {
    const until = printMoment(shipment.promisedAt.toISOString(), shipment.toZone)
    throw new Problem('order-moved', `The box is promised until ${until}. After that you can say it is late.`)
  }
  await inTransaction((tx) =>
    applyEdge(tx, {
      edge: 'E36',
      orderId: order.id,
      commandId,
      actor: 'buyer',
      actorId: caller.memberId,
      change: { claimType: 'late_or_lost' },
    }),
  )
  return showAgain(shipped)
}
