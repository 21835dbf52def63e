import { now } from '@/server/clock'
import { dayOf } from '@/server/listings/day-of'
import { judgeWay } from '@/server/shipping/judge-way'
import { askWay, shipDayRuleOf, type OrderWay } from '@/server/weather/order-way'
import { Problem } from '@/shared/api/problem'
import { judgeShipDay, nearestShipDay } from '@/shared/domain/shipping/ship-days'
import { reasonTexts, type ReasonCode } from '@/shared/domain/transport/reason-texts.facts'

/** A new day for a held box has to be ahead, lawful and safe; refuses with the reason and the nearest lawful day. */
export async function requireShipDay(way: OrderWay, shipDay: string): Promise<void> {
  const today = dayOf(now(), way.seller.zone)
  const rule = await shipDayRuleOf(way.terms, today)
  const judged = judgeShipDay(shipDay, rule)
  const [fault] = judged.faults
  if (shipDay <= today || fault) {
    const nearest = nearestShipDay(shipDay > today ? shipDay : today, rule)?.shipDay
    const why = fault?.why ? `${fault.why} stands in the way.` : 'Boxes do not leave on that day.'
    throw new Problem('fields-invalid', undefined, {
      errors: [
        {
          detail: `${shipDay <= today ? 'That day is not ahead.' : why} Choose another.`,
          pointer: '#/shipDay',
        },
      ],
      ...(nearest ? { facts: { nearestShipDay: nearest } } : {}),
    })
  }
  const answer = await judgeWay(askWay(way, shipDay, true))
  if (answer.verdict === 'safe') return
  const because = answer.facts.reasons.map(({ code }) => reasonTexts[code as ReasonCode].text).join(' ')
  throw new Problem('trip-unsafe', `They would not survive the way on that day. ${because}`.trim())
}
