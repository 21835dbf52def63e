import { judgeWay, type JudgedWay } from '@/server/shipping/judge-way'
import { reasonsOf } from '@/server/shipping/reasons-of'
import { shipRuleOf } from '@/server/shipping/ship-rule'
import type { ShipWay } from '@/server/shipping/ship-way'
import type { ShipDayOffer, ShipDayOffers } from '@/shared/contracts/shipments'
import { lawfulShipDays, type JudgedShipDay } from '@/shared/domain/shipping/ship-days'

/** Three weeks of a seller who ships on three days; more is no choice but a calendar. House rule. */
const MOST_OFFERS = 9

function offerOf({ shipDay, arriveDay }: JudgedShipDay, { verdict, facts }: JudgedWay): ShipDayOffer {
  const { basis, packing, reasons, worst } = facts
  return {
    ...{ shipDay, arriveDay, verdict, basis },
    // How to pack is told of a day that can be chosen.
    ...(packing && verdict === 'safe' ? { packing } : {}),
    reasons: reasonsOf({ verdict, reasons }),
    ...(worst ? { worst } : {}),
  }
}

/** The next lawful days from a day on, each with what the way is like on it, and what the boxes cost. */
export async function offerShipDays(way: ShipWay, fromDay: string): Promise<ShipDayOffers> {
  const { charges, ...asked } = way
  const days = lawfulShipDays(fromDay, await shipRuleOf(way.terms, fromDay), MOST_OFFERS)
  const offers: ShipDayOffer[] = []
  for (const day of days)
    offers.push(offerOf(day, await judgeWay({ ...asked, boxes: charges.boxes, shipDay: day.shipDay })))
  return { ...charges, days: offers }
}
