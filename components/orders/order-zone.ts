import type { ShownOrder } from '@/shared/contracts/orders'

/** The zone in which an order's times are told: of the pickup, or of the place where the box arrives. */
export function zoneOf({ slot, shipment }: Pick<ShownOrder, 'slot' | 'shipment'>): string {
  return shipment?.toZone ?? slot?.zone ?? 'America/New_York'
}
