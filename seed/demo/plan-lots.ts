import type { LotPlan } from '@/seed/demo/batch-plan'
import { harvestLots, mediaLots, wormLots } from '@/seed/demo/lot-story.facts'
import type { OrderPlan } from '@/seed/demo/plan-orders'
import { dayPlus, slotsOf, type Rhythm, type Slot } from '@/seed/demo/pickup-times'
import { need, type Farm, type Stage } from '@/seed/demo/stage'
import { after, DAY_MS, HOUR_MS } from '@/seed/demo/timeline'
import { seededRandom } from '@/seed/seeded-random'
import { dayOf } from '@/server/listings/day-of'

const everyDay = [0, 1, 2, 3, 4, 5, 6]
const evenings: Rhythm = { weekdays: everyDay, from: '17:00', until: '19:00', capacity: 6 }
const saturdays: Rhythm = { weekdays: [3, 6], from: '10:00', until: '12:00', capacity: 5 }

const PRODUCE_SINCE_HOURS = 20
const SUPPLIES_SINCE_DAYS = 24

type Told = (typeof harvestLots | typeof wormLots | typeof mediaLots)[number]

/** What every lot has beside its answers. */
function begun(stage: Stage, told: Told, given: { submittedAt: Date; slots: Slot[] }): Omit<LotPlan, 'body'> {
  const { key, picture, caption } = told
  const farm = farmOf(stage, told)
  const takenOn = dayOf(given.submittedAt, farm.zone)
  const shots = [{ picture, caption, hasRuler: false, takenOn, framing: `lot ${key}` }]
  return { key: `lot ${key}`, farm, ...given, decidedAt: after(given.submittedAt, 3 * HOUR_MS), shots }
}

const farmOf = ({ farms }: Stage, { farm }: Told): Farm => need(farms.get(farm), farm)
const counted = { minOrder: 1, orderStep: 1 }

/** Cut tomorrow and collected on the two evenings after: what is on sale on any day the demo is opened. */
function planHarvest(stage: Stage, told: (typeof harvestLots)[number]): LotPlan {
  const { zone } = farmOf(stage, told)
  const submittedAt = after(stage.at, -PRODUCE_SINCE_HOURS * HOUR_MS)
  const day = dayPlus(dayOf(stage.at, zone), 1)
  const slots = slotsOf(evenings, { after: stage.at, until: after(stage.at, 4 * DAY_MS) }, zone)
  const { variety, ...says } = told.says
  const isWarm = says.cropId === 'basil' || says.cropId === 'tomato'
  return {
    ...begun(stage, told, { submittedAt, slots: slots.filter((slot) => slot.day >= day).slice(0, 2) }),
    body: {
      ...{ category: 'produce', ...counted, ...says, ...(variety ? { variety } : {}) },
      harvest: { day, time: '07:30' },
      handling: {
        ...{ touchesSystemWater: 'no', rinsedInDrinkingWater: true },
        ...{ heldC: isWarm ? 12.5 : 1, coldAtPickup: !isWarm },
      },
      standing: 'not-covered',
      ...{ placeKind: 'farm-gate', balanceDue: 'before', depositPct: 100, freeCancelHours: 12 },
    },
  }
}

function planSupply(stage: Stage, told: Told): Omit<LotPlan, 'body'> {
  const { zone } = farmOf(stage, told)
  const submittedAt = after(stage.at, -SUPPLIES_SINCE_DAYS * DAY_MS)
  const span = { after: after(submittedAt, 2 * DAY_MS), until: after(stage.at, 30 * DAY_MS) }
  return begun(stage, told, { submittedAt, slots: slotsOf(saturdays, span, zone) })
}

const supplyTerms = {
  minOrder: 1,
  orderStep: 1,
  placeKind: 'farm-gate',
  accept: 'instant',
  balanceDue: 'at-handover',
  freeCancelHours: 24,
} as const

function planWorms(stage: Stage, told: (typeof wormLots)[number]): LotPlan {
  const { countMethod, ...says } = told.says
  return {
    ...planSupply(stage, told),
    body: {
      ...{ category: 'worms', ...supplyTerms, ...says, ...(countMethod ? { countMethod } : {}) },
      ...{ grading: 'bed-run', overcountPct: 5, raisedInUs: true, lotChecked: true, depositPct: 25 },
      ...{ origin: 'hatched-here', wildCaught: false, statesServed: ['OH', 'KY', 'IN'] },
      licenceNumbers: 'None needed for worms raised here',
      promise: {
        ...{ windowHours: 12, survivalDays: 0, remedy: 'refund' },
        evidence: 'A photo of the open pack on a sheet of paper',
      },
    },
  }
}

function planMedia(stage: Stage, told: (typeof mediaLots)[number]): LotPlan {
  const { grainLoMm, grainHiMm, rinsed, vinegarTest, usedWords, heatTreated, ...says } = told.says
  return {
    ...planSupply(stage, told),
    body: {
      ...{ category: 'media', ...supplyTerms, depositPct: 20, ...says },
      ...(grainLoMm === undefined ? {} : { grainLoMm }),
      ...(grainHiMm === undefined ? {} : { grainHiMm }),
      ...(rinsed === undefined ? {} : { rinsed }),
      ...(vinegarTest === undefined ? {} : { vinegarTest }),
      ...(usedWords === undefined ? {} : { usedWords }),
      ...(heatTreated === undefined ? {} : { heatTreated }),
    },
  }
}

/** Worms, media and produce of the demo, from farms that sell fish beside. */
export function planLots(stage: Stage): LotPlan[] {
  return [
    ...harvestLots.map((told) => planHarvest(stage, told)),
    ...wormLots.map((told) => planWorms(stage, told)),
    ...mediaLots.map((told) => planMedia(stage, told)),
  ]
}

/** Who has ordered of it already: a few for the days to come, and one of each supply that is long done. */
export function planLotOrders(stage: Stage, lots: readonly LotPlan[]): OrderPlan[] {
  return lots.flatMap((batch) => {
    const chance = seededRandom(`orders of ${batch.key}`)
    const near = stage.growers.filter(({ state }) => state === batch.farm.facts.state)
    const isFresh = batch.body.category === 'produce'
    const slot = batch.slots.find(({ startsAt }) => startsAt > after(stage.at, 6 * HOUR_MS)) ?? null
    const waits = batch.body.accept === 'ask'
    const coming = Array.from({ length: isFresh ? 2 : 1 }, (_, at): OrderPlan => {
      const reservedAt = after(stage.at, -chance.between(waits ? 1 : 3, waits ? 4 : 14) * HOUR_MS)
      return {
        ...{ key: `${batch.key} ${at}`, path: waits ? 'requested' : 'scheduled', batch, slot, reservedAt },
        ...{ buyer: chance.pick(near), quantity: chance.whole(1, 3), payMode: 'deposit' },
      }
    })
    const past = batch.slots.find(({ startsAt }) => startsAt > after(batch.decidedAt, 5 * DAY_MS))
    if (isFresh || !past || past.endsAt > after(stage.at, -2 * DAY_MS)) return coming
    const done: OrderPlan = {
      ...{ key: `${batch.key} done`, path: 'goods-settled', batch, slot: past, payMode: 'deposit' },
      ...{ buyer: chance.pick(near), quantity: 2, reservedAt: after(past.startsAt, -3 * DAY_MS) },
    }
    return [done, ...coming]
  })
}
