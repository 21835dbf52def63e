import { now } from '@/server/clock'
import { log } from '@/server/log'
import { checkMoments } from '@/server/shipping/ship-slot'
import { checkWay } from '@/server/weather/check-way'
import { listChecksOf, listLeavingSoon } from '@/server/weather/weather-store'
import { listShipmentsOf } from '@/server/orders/shipment-store'
import { Problem } from '@/shared/api/problem'
import { dateAfter } from '@/shared/domain/calendar/day-number'

const HOUR_MS = 3_600_000
/** From 16:00 of the day before to 06:00 of the day are 14 hours, or 15 when the clocks go back. */
const LOOK_AHEAD_MS = 15 * HOUR_MS
const MOST_AT_A_TIME = 200

/** Which of the two checks of a ship day is due; a late start makes up for the morning alone. null: none. */
export function dueCheck(
  at: Date,
  moments: { evening: Date; morning: Date },
  made: ReadonlySet<string>,
): 'evening' | 'morning' | null {
  if (at >= moments.morning) return made.has('morning') ? null : 'morning'
  if (at >= moments.evening) return made.has('evening') ? null : 'evening'
  return null
}

/** 16:00 of the day before and 06:00 of the day, at the seller's place: boxes whose way has turned unsafe are held. */
export async function checkDueWays(): Promise<void> {
  const at = now()
  const orders = await listLeavingSoon(at, new Date(at.getTime() + LOOK_AHEAD_MS), MOST_AT_A_TIME)
  const ids = orders.map((order) => order.id)
  const [shipments, checks] = [await listShipmentsOf(ids), await listChecksOf(ids)]
  for (const order of orders) {
    const shipDay = shipments.find((one) => one.orderId === order.id)?.shipDay
    if (!shipDay) continue
    const made = new Set(
      checks.filter((one) => one.orderId === order.id && one.shipDay === shipDay).map((one) => one.kind),
    )
    const kind = dueCheck(at, checkMoments(shipDay, dateAfter(shipDay, -1), order.zone), made)
    if (!kind) continue
    try {
      await checkWay(order, { kind, holds: true, isFresh: true })
    } catch (error) {
      if (error instanceof Problem && error.slug === 'order-moved') continue
      log.error({ err: error, orderId: order.id, kind }, 'a way could not be looked at')
    }
  }
}
