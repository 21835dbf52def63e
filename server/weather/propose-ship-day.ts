import { now } from '@/server/clock'
import { dayOf } from '@/server/listings/day-of'
import { judgeWay } from '@/server/shipping/judge-way'
import { shipRuleOf } from '@/server/shipping/ship-rule'
import { shipSlot } from '@/server/shipping/ship-slot'
import type { OrderWay } from '@/server/weather/order-way'
import { dateAfter } from '@/shared/domain/calendar/day-number'
import { clockMs } from '@/shared/domain/orders/clocks.facts'
import { FASTING_DAYS } from '@/shared/domain/shipping/fasting-days'
import { lawfulShipDays } from '@/shared/domain/shipping/ship-days'

/** House rule: so many lawful days are looked at before the hold is left open-ended. */
const MOST_LOOKED_AT = 15

/**
 * The first lawful day on which the way is safe, late enough that the animals can be kept without food once the
 * buyer's silence has ended, and within 30 days of the day agreed before. null: none, so the hold is open-ended.
 */
export async function proposeShipDay({ order, way }: OrderWay): Promise<string | null> {
  const { charges, ...asked } = way
  const { category } = way.terms
  const silenceEndsAt = new Date(now().getTime() + clockMs('weatherConsent', category))
  const fromDay = dateAfter(dayOf(silenceEndsAt, way.zone), FASTING_DAYS)
  const latestMs = (order.slotStartsAt ?? now()).getTime() + clockMs('weatherSilence', category)
  for (const { shipDay } of lawfulShipDays(fromDay, await shipRuleOf(way.terms, fromDay), MOST_LOOKED_AT)) {
    const startsAt = shipSlot(shipDay, way.zone).slotStartsAt
    if (startsAt.getTime() > latestMs) return null
    const { verdict } = await judgeWay({ ...asked, boxes: charges.boxes, shipDay })
    if (verdict === 'safe') return shipDay
  }
  return null
}
