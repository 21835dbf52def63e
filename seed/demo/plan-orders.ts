import type { BatchPlan, LotPlan } from '@/seed/demo/batch-plan'
import { orderPaths, type OrderPath, type PathFacts } from '@/seed/demo/order-story.facts'
import type { ShipPath } from '@/seed/demo/ship-story.facts'
import { slotAfter, slotBefore, type Slot } from '@/seed/demo/pickup-times'
import { need, type Actor, type Stage } from '@/seed/demo/stage'
import { after, DAY_MS, HOUR_MS, MINUTE_MS } from '@/seed/demo/timeline'
import { seededRandom, type Chance } from '@/seed/seeded-random'

/** Collected, and settled by time; nothing of it is rated or counted again. */
export type GoodsPath = 'goods-settled'

export interface OrderPlan {
  key: string
  path: OrderPath | ShipPath | GoodsPath
  batch: LotPlan
  buyer: Actor
  quantity: number
  payMode: 'deposit' | 'full'
  /** null: the batch offers no day any more. */
  slot: Slot | null
  reservedAt: Date
  /** Set where the animals go by box; the slot is then the ship day. */
  ship?: { shipDay: string; street: string }
}

/** Kinds that people of all three states may buy of each other, as the demonstration's rows have it. */
const crossing = new Set([
  'bluegill',
  'hybrid_bluegill',
  'channel_catfish',
  'common_carp_koi',
  'goldfish',
  'fathead_minnow',
])
const LEAD_DAYS = 2.6
const mayBePaidWhole = new Set<OrderPath>(['confirmed', 'closed-by-time', 'short', 'handed-over'])

/** A window and the moment the buyer took it, or null when this batch has none that fits. */
type Chosen = Pick<OrderPlan, 'slot' | 'reservedAt'> | null
interface Choice {
  stage: Stage
  chance: Chance
  /** How many days ahead of the window the buyer orders. */
  leadDays: readonly [least: number, most: number]
}
type Choose = (batch: BatchPlan, choice: Choice) => Chosen

const daysBefore = (at: Date, days: number) => after(at, -days * DAY_MS)

/** A window the seller adds because somebody asked for that day. */
function added(slot: Slot | undefined, batch: BatchPlan, reservedAt: Date): Chosen {
  if (!slot || reservedAt < after(batch.decidedAt, HOUR_MS)) return null
  batch.slots = [...batch.slots.filter((one) => one.startsAt.getTime() !== slot.startsAt.getTime()), slot]
  return { slot, reservedAt }
}

const choosers: Record<PathFacts['slot'], Choose> = {
  past: (batch, { stage, chance, leadDays: [least, most] }) => {
    const from = after(batch.decidedAt, (least + 0.1) * DAY_MS)
    const fitting = batch.slots.filter(
      (slot) => slot.startsAt > from && slot.endsAt < daysBefore(stage.at, 4.5),
    )
    if (fitting.length === 0) return null
    const slot = chance.pick(fitting)
    const wanted = daysBefore(slot.startsAt, chance.between(least, most))
    const earliest = after(batch.decidedAt, HOUR_MS)
    return { slot, reservedAt: wanted < earliest ? earliest : wanted }
  },
  coming: (batch, { stage, chance }) => {
    const from = daysBefore(stage.at, -LEAD_DAYS)
    const slot = batch.slots.find((one) => one.startsAt > from)
    return slot ? { slot, reservedAt: after(stage.at, -chance.between(3, 30) * HOUR_MS) } : null
  },
  any: (batch, { stage, chance }) => {
    const reservedAt = daysBefore(stage.at, chance.between(4, 18))
    const slot = batch.slots.find((one) => one.startsAt > daysBefore(reservedAt, -LEAD_DAYS))
    return slot && reservedAt > after(batch.decidedAt, HOUR_MS) ? { slot, reservedAt } : null
  },
  // Of those who have just collected none may be past the time to say so.
  just: (batch, { stage, chance }) =>
    batch.body.promise.windowHours < 24
      ? null
      : added(
          slotBefore(after(stage.at, -40 * MINUTE_MS), batch.farm.zone),
          batch,
          daysBefore(stage.at, chance.between(3, 6)),
        ),
  gone: (batch, { stage, chance }) =>
    added(
      slotBefore(after(stage.at, -32 * HOUR_MS), batch.farm.zone),
      batch,
      daysBefore(stage.at, chance.between(4, 7)),
    ),
  next: (batch, { stage, chance }) =>
    added(
      slotAfter(after(stage.at, 2 * HOUR_MS), batch.farm.zone),
      batch,
      daysBefore(stage.at, chance.between(3, 6)),
    ),
  none: (_batch, { stage }) => ({ slot: null, reservedAt: daysBefore(stage.at, 3) }),
}

interface Casting {
  stage: Stage
  batches: readonly BatchPlan[]
  /** Orders a batch has already: the next goes to another. */
  load: Map<string, number>
}

/** Whether the batch may carry such an order at all: the right one, the right farm, to be had now. */
function isMeant({ body, key, farm }: BatchPlan, facts: PathFacts): boolean {
  if (facts.batch) return key === facts.batch
  if (key === 'last pail' || key === 'no more days' || body.readyOn) return false
  return !facts.farm || farm.facts.key === facts.farm
}

const hasTerms = ({ body }: BatchPlan, { accept, balanceDue }: PathFacts) =>
  (!accept || body.accept === accept) && (!balanceDue || body.balanceDue === balanceDue)

function buyerFor(
  batch: BatchPlan,
  { growers, people }: Stage,
  { facts, chance }: { facts: PathFacts; chance: Chance },
): Actor {
  if (facts.buyer) return need(people.get(facts.buyer), facts.buyer)
  const home = batch.farm.facts.state
  const isOpen = crossing.has(batch.body.taxonId) && batch.body.statesServed.length > 1 && chance.happens(0.3)
  return chance.pick(growers.filter((grower) => isOpen || grower.state === home))
}

/**
 * Batches for such an order, the best first: with the terms it needs and few orders so far. One without any order yet
 * can still be listed under other terms, so that no story of the demo hangs on chance.
 */
function candidates({ batches, load }: Casting, facts: PathFacts, chance: Chance): BatchPlan[] {
  const ordersOf = (batch: BatchPlan) => load.get(batch.key) ?? 0
  return batches
    .filter((batch) => isMeant(batch, facts) && (hasTerms(batch, facts) || ordersOf(batch) === 0))
    .map((batch) => ({ batch, rank: (hasTerms(batch, facts) ? 0 : 100) + ordersOf(batch) + chance.next() }))
    .sort((one, other) => one.rank - other.rank)
    .map(({ batch }) => batch)
}

function cast(casting: Casting, facts: PathFacts, key: string): OrderPlan {
  const { stage, load } = casting
  const chance = seededRandom(`order ${key}`)
  for (const batch of candidates(casting, facts, chance)) {
    const leadDays = facts.leadDays ?? [LEAD_DAYS, 6.5]
    const chosen = choosers[facts.slot](batch, { stage, chance, leadDays })
    if (!chosen) continue
    const { accept, balanceDue } = { ...batch.body, ...facts }
    batch.body = { ...batch.body, accept, balanceDue }
    load.set(batch.key, (load.get(batch.key) ?? 0) + 1)
    const { minOrder, orderStep } = batch.body
    const isNow = facts.path === 'reserved'
    return {
      ...{ key, path: facts.path, batch, slot: chosen.slot },
      quantity: facts.quantity ?? minOrder + orderStep * chance.whole(0, 3),
      buyer: buyerFor(batch, stage, { facts, chance }),
      payMode: mayBePaidWhole.has(facts.path) && chance.happens(0.3) ? 'full' : 'deposit',
      reservedAt: isNow ? after(stage.at, -chance.between(2, 6) * MINUTE_MS) : chosen.reservedAt,
    }
  }
  throw new Error(`no batch of the demo suits an order that is "${facts.path}"`)
}

/** All orders of the demo. Some add a pickup window to their batch: plan them before the batches are published. */
export function planOrders(stage: Stage, batches: readonly BatchPlan[]): OrderPlan[] {
  const load = new Map<string, number>()
  return orderPaths.flatMap((facts, row) =>
    Array.from({ length: facts.times }, (_, at) =>
      cast({ stage, batches, load }, facts, `${row}.${at} ${facts.path}`),
    ),
  )
}
