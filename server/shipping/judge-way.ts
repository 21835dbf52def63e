import { wayWeather, type WayWeather } from '@/server/shipping/way-weather'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { BoxPacking, RouteCheckFacts } from '@/shared/contracts/shipments'
import { massForLoadG } from '@/shared/domain/animals/length-to-mass'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import { packingClasses } from '@/shared/domain/season/season-classes.facts'
import {
  packsOfPlan,
  planShipment,
  planShipmentAhead,
  type ShipmentPlan,
} from '@/shared/domain/shipping/plan-shipment'
import { worstAir } from '@/shared/domain/shipping/worst-air'
import { findSpecies } from '@/shared/domain/species/find-species'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import type { Animals } from '@/shared/domain/transport/trip'

export interface AskedWay {
  terms: FishBody
  quantity: number
  boxes: number
  shipDay: string
  from: CellPoint & { name: string }
  to: CellPoint & { name: string }
  /** Ask the forecast anew rather than take an answer of the last minutes. */
  isFresh?: boolean
}

export interface JudgedWay {
  verdict: 'safe' | 'unsafe' | 'unknown'
  facts: RouteCheckFacts
  /** Behind `facts.packing`: what a packing sheet is printed from. */
  plan: ShipmentPlan | null
}

/** Everything that weather does not change. */
function taskOf({ terms, quantity, boxes }: Pick<AskedWay, 'terms' | 'quantity' | 'boxes'>) {
  const { shipping, water } = terms
  if (!shipping) throw new Error('this batch is not shipped')
  const animals = animalsOf(terms, quantity)
  if (!animals) return null
  const { khPpm, pH } = water
  return { animals, boxes, packing: shipping.packing, water: { alkalinityMeqPerL: khPpm / PPM_PER_MEQ, pH } }
}

const PPM_PER_MEQ = 50

/** The animals of an order as the trip engine reads them, fasted as the species asks. null: no figures for them. */
function animalsOf(terms: FishBody, count: number): Animals | null {
  const species = findSpecies(findTaxon(terms.taxonId)?.speciesId ?? '')
  // The longest of the batch weigh most: plan by them.
  const massG = species && massForLoadG(species, terms.sizeHiMm)
  if (!species || massG === null) return null
  return {
    ...{ species, count, massG },
    stage: terms.stage === 'fry' ? 'swim-up-fry' : 'fingerling',
    shortestMm: terms.sizeLoMm,
    longestMm: terms.sizeHiMm,
    fastedHours: species.fastHours,
  }
}

function packingOf(plan: ShipmentPlan, boxes: number): BoxPacking {
  const { container } = plan.trip
  const { kind, count } = packsOfPlan(plan)
  const { answer, animalsPerBox, startC } = plan
  const heat = container.kind === 'vessel' ? null : container.packs.heat
  return {
    ...{ boxes, animalsPerBox, startC, packs: kind, packCount: count, hours: answer.hours },
    ...(heat ? { packHours: Number(/\d+/.exec(heat.id)?.[0] ?? 0) } : {}),
    ...(container.kind === 'bags'
      ? {
          bagsPerBox: container.bagsPerBox,
          animalsPerBag: Math.ceil(animalsPerBox / container.bagsPerBox),
          waterLPerBag: container.waterLPerBag,
          oxygenLPerBag: container.oxygenLPerBag,
        }
      : {}),
    ...(container.kind === 'bedding' ? { beddingKg: container.beddingKg } : {}),
    ...(answer.cold?.coldest ? { coldestC: answer.cold.coldest.waterC } : {}),
    ...(answer.hot?.warmest ? { warmestC: answer.hot.warmest.waterC } : {}),
  }
}

function unknownWay(known: WayWeather | null): JudgedWay {
  const basis = known?.basis ?? 'long-term'
  return { verdict: 'unknown', plan: null, facts: { basis, reasons: [] } }
}

const plannerOf = (basis: RouteCheckFacts['basis']) =>
  basis === 'forecast' ? planShipment : planShipmentAhead

/** The plan behind a check that was kept, made again from the weather it kept. null: the forecast still decides. */
export function planOfCheck(
  asked: Pick<AskedWay, 'terms' | 'quantity' | 'boxes'>,
  { basis, weather }: RouteCheckFacts,
): ShipmentPlan | null {
  const task = taskOf(asked)
  return task && weather ? plannerOf(basis)({ ...task, weather }).plan : null
}

/** Whether an order survives its way on a day, packed the seller's way, and how each box is to be packed for it. */
export async function judgeWay(asked: AskedWay): Promise<JudgedWay> {
  const { terms, boxes, shipDay, from, to, isFresh } = asked
  const { shipping } = terms
  if (!shipping) throw new Error('this batch is not shipped')
  const { nights } = packingClasses[shipping.packing]
  const known = await wayWeather({ from, to, shipDay, nights, isFresh: isFresh ?? false })
  const task = taskOf(asked)
  if (!known || !task) return unknownWay(known)
  const { basis, weather } = known
  const answer = plannerOf(basis)({ ...task, weather })
  const worst = answer.verdict === 'safe' ? null : worstAir(weather, answer.reasons)
  return {
    verdict: answer.verdict,
    plan: answer.plan,
    facts: {
      basis,
      weather,
      ...(answer.plan ? { packing: packingOf(answer.plan, boxes) } : {}),
      reasons: answer.reasons.map(({ code, verdict, value, limit }) => ({ code, verdict, value, limit })),
      ...(worst
        ? {
            worst: {
              side: worst.side,
              airC: worst.airC,
              place: worst.end === 'origin' ? from.name : to.name,
            },
          }
        : {}),
    },
  }
}
