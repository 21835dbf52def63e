import { now } from '@/server/clock'
import type { OrderRow } from '@/server/orders/order-store'

const DAY_MS = 86_400_000

/**
 * Whether the day chosen with the reservation is agreed in the same breath as the deposit is paid. A ship day that has
 * come too near while the seller thought about it is not: the animals could not be kept without food in time.
 */
export function dayFollows({ handOver, windowId, slotStartsAt }: OrderRow): boolean {
  if (handOver !== 'ship') return windowId !== null
  return slotStartsAt !== null && slotStartsAt.getTime() - now().getTime() >= DAY_MS
}
