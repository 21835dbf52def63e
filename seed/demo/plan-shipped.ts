import type { BatchPlan } from '@/seed/demo/batch-plan'
import type { OrderPlan } from '@/seed/demo/plan-orders'
import { dayPlus, slotOn } from '@/seed/demo/pickup-times'
import { shippedKinds, shipStories, shipStreets, type ShipStory } from '@/seed/demo/ship-story.facts'
import { need, type Actor, type Stage } from '@/seed/demo/stage'
import { after, DAY_MS, HOUR_MS } from '@/seed/demo/timeline'
import { seededRandom, type Chance } from '@/seed/seeded-random'
import { dayOf } from '@/server/listings/day-of'
import { federalDays } from '@/server/shipping/federal-days'
import { packingClasses } from '@/shared/domain/season/season-classes.facts'
import { judgeShipDay, type NoShipDays } from '@/shared/domain/shipping/ship-days'

/** Days between the order and the day the box leaves: time to fast, and inside the forecast. */
const LEAD_DAYS = 5

const boxTerms: NonNullable<BatchPlan['body']['shipping']> = {
  packing: 'foam-38-overnight',
  boxCents: 1200,
  freightCents: 4850,
  carrier: 'Overnight air, by noon',
  carrierAccepts: true,
  holdsAtCounter: true,
  mostInBox: 100,
  days: ['mon', 'tue', 'wed'],
}

function carriersRest({ at }: Stage): NoShipDays {
  const year = at.getUTCFullYear()
  return new Map(federalDays(year - 1, year + 1).map(({ day, why }) => [day, why]))
}

interface Choice {
  stage: Stage
  noShipDays: NoShipDays
  chance: Chance
  /** Buyers of the same story. */
  taken: readonly Actor[]
}

function shipDayFor(zone: string, { daysFromNow: [least, most] }: ShipStory, choice: Choice): string | null {
  const today = dayOf(choice.stage.at, zone)
  const rule = {
    days: boxTerms.days,
    nights: packingClasses[boxTerms.packing].nights,
    noShipDays: choice.noShipDays,
  }
  for (let ahead = least; ahead <= most; ahead++) {
    const day = dayPlus(today, ahead)
    if (judgeShipDay(day, rule).faults.length === 0) return day
  }
  return null
}

/** Nobody has two boxes of the same story under way. */
function buyerFor({ farm }: BatchPlan, { buyer }: ShipStory, { stage, chance, taken }: Choice): Actor {
  if (buyer) return need(stage.people.get(buyer), buyer)
  return chance.pick(
    stage.growers.filter((grower) => grower.state === farm.facts.state && !taken.includes(grower)),
  )
}

/** A batch on sale early enough whose animals travel well; every one of them may be shipped from then on. */
function batchFor(
  batches: readonly BatchPlan[],
  story: ShipStory,
  choice: Choice,
): { batch: BatchPlan; shipDay: string; reservedAt: Date } | null {
  const suited = batches
    .filter(
      ({ body, farm }) =>
        !body.readyOn &&
        shippedKinds.some((kind) => kind === body.taxonId) &&
        (!story.farm || farm.facts.key === story.farm),
    )
    .map((batch) => ({ batch, rank: choice.chance.next() }))
    .sort((one, other) => one.rank - other.rank)
  for (const { batch } of suited) {
    const shipDay = shipDayFor(batch.farm.zone, story, choice)
    if (!shipDay) return null
    const begins = slotOn(
      { day: shipDay, from: '06:00', until: '18:00', capacity: 1 },
      batch.farm.zone,
    ).startsAt
    const usual = after(begins, -LEAD_DAYS * DAY_MS + 9 * HOUR_MS)
    const latest = after(choice.stage.at, -20 * HOUR_MS)
    const reservedAt = usual < latest ? usual : latest
    if (reservedAt > after(batch.decidedAt, HOUR_MS)) return { batch, shipDay, reservedAt }
  }
  return null
}

function cast(
  batches: readonly BatchPlan[],
  story: ShipStory,
  given: Omit<Choice, 'chance'> & { key: string },
): OrderPlan[] {
  const { key, ...rest } = given
  const choice = { ...rest, chance: seededRandom(`order ${key}`) }
  const found = batchFor(batches, story, choice)
  // On some dates no lawful day lies in reach: the demo does without that story.
  if (!found) return []
  const { batch, shipDay, reservedAt } = found
  const home = batch.farm.facts.state
  const buyer = buyerFor(batch, story, choice)
  batch.body = {
    ...batch.body,
    shipping: boxTerms,
    statesServed: [...new Set([...batch.body.statesServed, home, buyer.state])],
  }
  return [
    {
      ...{ key, path: story.path, batch, buyer, reservedAt },
      quantity: batch.body.minOrder,
      payMode: 'deposit',
      slot: slotOn({ day: shipDay, from: '06:00', until: '18:00', capacity: 1 }, batch.farm.zone),
      ship: { shipDay, street: choice.chance.pick(shipStreets) },
    },
  ]
}

/** All orders of the demo that are shipped. They change the terms of their batches: plan them before those are published. */
export function planShipped(stage: Stage, batches: readonly BatchPlan[]): OrderPlan[] {
  const noShipDays = carriersRest(stage)
  return shipStories.flatMap((story, row) => {
    const plans: OrderPlan[] = []
    for (let at = 0; at < story.times; at++) {
      const key = `box ${row}.${at} ${story.path}`
      const taken = plans.map(({ buyer }) => buyer)
      plans.push(...cast(batches, story, { stage, noShipDays, taken, key }))
    }
    return plans
  })
}
