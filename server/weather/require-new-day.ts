import type { OrderRow } from '@/server/orders/order-store'
import { requireLawfulDay, requireSafeWay } from '@/server/shipping/require-ship-day'
import { loadOrderWay } from '@/server/weather/order-way'

/** A day that is named for a held box has to be lawful and safe; nothing is asked of an order that is collected. */
export async function requireNewDay(order: OrderRow, shipDay: string): Promise<void> {
  const held = await loadOrderWay(order)
  if (!held) return
  await requireLawfulDay(held.way, { shipDay, pointer: '#/shipDay' })
  await requireSafeWay(held.way, shipDay)
}
