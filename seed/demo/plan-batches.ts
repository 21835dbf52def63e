import type { BatchPlan } from '@/seed/demo/batch-plan'
import { planBatch } from '@/seed/demo/plan-batch'
import { dayPlus } from '@/seed/demo/pickup-times'
import { need, type Farm, type Stage } from '@/seed/demo/stage'
import { after, DAY_MS } from '@/seed/demo/timeline'
import { seededRandom } from '@/seed/seeded-random'
import { dayOf } from '@/server/listings/day-of'

const READY_IN_DAYS = 24

/** What a farm has on sale: its kinds in turn, some listed weeks ago and some just now. */
function batchesOf(stage: Stage, farm: Farm): BatchPlan[] {
  const { key, keeps, batches: count } = farm.facts
  const chance = seededRandom(`batches of ${key}`)
  return Array.from({ length: count }, (_, at) =>
    planBatch(stage, {
      key: `${key} ${at + 1}`,
      farm,
      taxonId: need(keeps[at % keeps.length], `kind of ${key}`),
      daysAgo: chance.happens(0.7) ? chance.whole(20, 48) : chance.whole(2, 14),
    }),
  )
}

/** Hatched already, to be had only in some weeks: a batch to order ahead. */
function orderAhead(stage: Stage, plan: BatchPlan): void {
  const ready = dayPlus(dayOf(stage.at, plan.farm.zone), READY_IN_DAYS)
  const later = plan.slots.filter((slot) => slot.day >= ready)
  if (later.length === 0) return
  plan.slots = later
  plan.body = {
    ...plan.body,
    readyOn: ready,
    words: `${plan.body.words} Ready in about three weeks; order ahead.`,
  }
}

/** Exactly so many that two orders of half of them leave none. */
function lastPail(stage: Stage): BatchPlan {
  const plan = planBatch(stage, {
    key: 'last pail',
    farm: need(stage.farms.get('brickyard'), 'brickyard'),
    taxonId: 'goldfish',
    daysAgo: 26,
  })
  const body = {
    ...plan.body,
    accept: 'instant',
    countOnHand: 40,
    minOrder: 20,
    orderStep: 5,
    tiers: [{ fromCount: 20, unitCents: 45 }],
  } as const
  return { ...plan, body: { ...body, tiers: [...body.tiers] } }
}

/** Its pickup days are over; who orders now agrees on a day afterwards. */
function noMoreDays(stage: Stage): BatchPlan {
  const plan = planBatch(stage, {
    key: 'no more days',
    farm: need(stage.farms.get('riverstep'), 'riverstep'),
    taxonId: 'bluegill',
    daysAgo: 33,
  })
  plan.body = { ...plan.body, accept: 'instant' }
  plan.slots = plan.slots.filter((slot) => slot.startsAt < after(stage.at, -6 * DAY_MS))
  return plan
}

/** Every batch of the demo that a moderator has approved. */
export function planBatches(stage: Stage): BatchPlan[] {
  const plans = [...stage.farms.values()]
    .filter((farm) => farm.facts.payouts === 'ready' && farm.facts.licence !== 'unsure')
    .flatMap((farm) => batchesOf(stage, farm))
  for (const plan of plans.filter((_, at) => at % 23 === 11)) orderAhead(stage, plan)
  return [...plans, lastPail(stage), noMoreDays(stage)]
}
