import { NO_LANE, laneOf } from '@/shared/domain/season/season-lane'
import { shipmentOf, type ShippedBatch } from '@/shared/domain/season/shipment-of'

/** The `lane` of a batch's search row; `NO_LANE` where animal or climate is not known to the season table. */
export function laneOfBatch(batch: ShippedBatch): number {
  const shipment = shipmentOf(batch, batch.from)
  if (!shipment || shipment.origin === null) return NO_LANE
  return laneOf({ ...shipment, origin: shipment.origin })
}
