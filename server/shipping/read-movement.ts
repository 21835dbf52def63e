import type { Caller } from '@/server/http/caller'
import { orderSeenBy } from '@/server/orders/party-of'
import { listShipmentsOf } from '@/server/orders/shipment-store'
import { Problem } from '@/shared/api/problem'
import type { MovementFacts } from '@/shared/contracts/shipments'

/** The paper that travelled with the animals, for the two parties and for staff; there is none before they leave. */
export async function readMovement(caller: Caller, orderId: string): Promise<MovementFacts> {
  const { order } = await orderSeenBy(caller, orderId)
  const [shipment] = await listShipmentsOf([order.id])
  if (!shipment?.movement) throw new Problem('not-found')
  return shipment.movement
}
