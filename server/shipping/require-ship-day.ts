import { judgeWay, type JudgedWay } from '@/server/shipping/judge-way'
import { offerShipDays } from '@/server/shipping/offer-ship-days'
import { reasonsOf } from '@/server/shipping/reasons-of'
import { firstShipDay, shipRuleOf } from '@/server/shipping/ship-rule'
import type { ShipWay } from '@/server/shipping/ship-way'
import { Problem } from '@/shared/api/problem'
import { dateAfter } from '@/shared/domain/calendar/day-number'
import { printDate } from '@/shared/domain/calendar/print-date'
import { faultWords } from '@/shared/domain/shipping/fault-words'
import {
  judgeShipDay,
  nearestShipDay,
  SHIP_DAYS_AHEAD,
  type JudgedShipDay,
} from '@/shared/domain/shipping/ship-days'
import { worstWords } from '@/shared/domain/shipping/worst-words'

interface Wanted {
  shipDay: string
  /** Where the form holds the day: `#/shipDay`. */
  pointer: string
}

/** A lawful day that leaves time to keep the animals without food, or a field problem with the nearest one. */
export async function requireLawfulDay(
  way: Pick<ShipWay, 'terms' | 'zone'>,
  { shipDay, pointer }: Wanted,
): Promise<JudgedShipDay> {
  const first = firstShipDay(way.terms, way.zone)
  const rule = await shipRuleOf(way.terms, first)
  const judged = judgeShipDay(shipDay, rule)
  const [fault] = judged.faults
  const last = dateAfter(first, SHIP_DAYS_AHEAD)
  if (shipDay >= first && shipDay <= last && !fault) return judged
  const nearest = nearestShipDay(shipDay > first && shipDay <= last ? shipDay : first, rule)
  const why =
    shipDay > last
      ? `Nobody can promise a day so far ahead: the last one to choose is ${printDate(last)}.`
      : shipDay < first || !fault
        ? `The first day on which these animals can leave is ${printDate(first)}: they need a day or two without food.`
        : faultWords(fault)
  throw new Problem('fields-invalid', undefined, {
    errors: [{ detail: nearest ? `${why} The nearest day is ${printDate(nearest.shipDay)}.` : why, pointer }],
    ...(nearest ? { facts: { nearestShipDay: nearest.shipDay } } : {}),
  })
}

/** The way judged for a day; refused with the reasons unless it is safe. A way that nobody can judge is not safe. */
export async function requireSafeWay(way: ShipWay, shipDay: string): Promise<JudgedWay> {
  const { charges, ...asked } = way
  const judged = await judgeWay({ ...asked, boxes: charges.boxes, shipDay })
  const { verdict, facts } = judged
  if (verdict === 'safe') return judged
  const { days } = await offerShipDays(way, firstShipDay(way.terms, way.zone))
  const nearest = days.find((day) => day.verdict === 'safe')?.shipDay
  const said = [
    ...(facts.worst ? [worstWords(facts.worst)] : []),
    ...reasonsOf({ verdict, reasons: facts.reasons }),
    ...(nearest ? [`The nearest day that is safe is ${printDate(nearest)}.`] : []),
  ]
  throw new Problem('trip-unsafe', said.join(' '), {
    facts: { verdict, ...(nearest ? { nearestSafeDay: nearest } : {}) },
  })
}
