import type { OrderRow } from '@/server/orders/order-store'
import type { JudgedWay } from '@/server/shipping/judge-way'
import { requireLawfulDay, requireSafeWay } from '@/server/shipping/require-ship-day'
import { loadOrderWay } from '@/server/weather/order-way'
import { Problem } from '@/shared/api/problem'

export interface NamedDay {
  shipDay?: string | undefined
  windowId?: string | undefined
}

/** A box is given a ship day, a pickup a window. */
function requireKind({ handOver }: OrderRow, { shipDay, windowId }: NamedDay): void {
  const isShipped = handOver === 'ship'
  if ((isShipped ? windowId : shipDay) === undefined) return
  const pointer = isShipped ? '#/windowId' : '#/shipDay'
  const detail = isShipped
    ? 'This order is shipped: name a ship day.'
    : 'This order is collected: name a pickup time.'
  throw new Problem('fields-invalid', undefined, { errors: [{ detail, pointer }] })
}

/** The way on a day named for a held box, refused unless the day is lawful and the way safe. null: no ship day is named. */
export async function requireNewDay(order: OrderRow, named: NamedDay): Promise<JudgedWay | null> {
  requireKind(order, named)
  const { shipDay } = named
  const held = shipDay ? await loadOrderWay(order) : null
  if (!held || !shipDay) return null
  await requireLawfulDay(held.way, { shipDay, pointer: '#/shipDay' })
  return requireSafeWay(held.way, shipDay)
}
