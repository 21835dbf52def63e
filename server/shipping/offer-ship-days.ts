import { judgeWay, type JudgedWay } from '@/server/shipping/judge-way'
import { shipRuleOf } from '@/server/shipping/ship-rule'
import type { ShipWay } from '@/server/shipping/ship-way'
import type { ShipDayOffer, ShipDayOffers } from '@/shared/contracts/shipments'
import { lawfulShipDays, type JudgedShipDay } from '@/shared/domain/shipping/ship-days'
import { reasonSentences } from '@/shared/domain/shipping/reason-sentences'

/** Three weeks of a seller who ships on three days; more is no choice but a calendar. House rule. */
const MOST_OFFERS = 9

const NO_FIGURES =
  'We hold no figures for these animals or for the weather on this way, so nobody can say that they survive it.'

/** Why a way is not safe, in sentences; empty when it is. */
export function reasonsOf({ verdict, reasons }: { verdict: string; reasons: { code: string }[] }): string[] {
  const said = verdict === 'safe' ? [] : reasonSentences(reasons)
  return verdict === 'unknown' && said.length === 0 ? [NO_FIGURES] : said
}

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
