import type { Tx } from '@/db/transaction'
import { insertShipment } from '@/server/orders/shipment-store'
import type { FoundPlace } from '@/server/places/find-place'
import type { ReservedShipment } from '@/server/shipping/plan-reserved'
import { insertRouteCheck } from '@/server/weather/weather-store'

/** The rows of a shipped order beside the order itself: the shipment, and the check its day was agreed by. */
export async function writeReserved(
  tx: Tx,
  reserved: ReservedShipment,
  { orderId, place, at }: { orderId: number; place: FoundPlace; at: Date },
): Promise<void> {
  const { ask, charges, shipDay, arriveDay, promisedAt, carrier, packing, judged } = reserved
  await insertShipment(tx, {
    ...{ orderId, shipDay, arriveDay, promisedAt, carrier, packing },
    boxes: charges.boxes,
    deliverTo: ask.deliverTo,
    address: ask.address,
    toLat: place.centre.lat,
    toLng: place.centre.lng,
    toZone: place.zone,
    papers: [],
  })
  const { verdict, facts } = judged
  await insertRouteCheck(tx, { orderId, kind: 'reservation', shipDay, at, verdict, facts })
}
