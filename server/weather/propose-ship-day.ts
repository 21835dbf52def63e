import { now } from '@/server/clock'
import { dayOf } from '@/server/listings/day-of'
import { judgeWay } from '@/server/shipping/judge-way'
import { shipSlot } from '@/server/shipping/ship-slot'
import { askWay, shipDayRuleOf, type OrderWay } from '@/server/weather/order-way'
import { clockMs } from '@/shared/domain/orders/clocks.facts'
import { lawfulShipDays } from '@/shared/domain/shipping/ship-days'

/** House rule: so many lawful days are looked at before the hold is left open-ended. */
const MOST_LOOKED_AT = 15

/**
 * The first lawful day on which the way is safe, late enough that the buyer's silence has ended before it begins and
 * within 30 days of the day agreed before. null: none, so the hold is open-ended.
 */
export async function proposeShipDay(way: OrderWay): Promise<string | null> {
  const { order, terms, seller } = way
  const silenceEndsAt = new Date(now().getTime() + clockMs('weatherConsent', terms.category))
  const fromDay = dayOf(silenceEndsAt, seller.zone)
  const latestMs = (order.slotStartsAt ?? now()).getTime() + clockMs('weatherSilence', terms.category)
  const rule = await shipDayRuleOf(terms, fromDay)
  for (const { shipDay } of lawfulShipDays(fromDay, rule, MOST_LOOKED_AT)) {
    const startsAt = shipSlot(shipDay, order.zone).slotStartsAt
    if (startsAt < silenceEndsAt) continue
    if (startsAt.getTime() > latestMs) return null
    if ((await judgeWay(askWay(way, shipDay, false))).verdict === 'safe') return shipDay
  }
  return null
}
