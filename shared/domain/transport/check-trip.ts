import { boxLossWPerK } from '@/shared/domain/transport/box'
import { judgeAnimals } from '@/shared/domain/transport/judge-animals'
import { judgeBag } from '@/shared/domain/transport/judge-bag'
import { judgeBedding } from '@/shared/domain/transport/judge-bedding'
import { judgeVessel } from '@/shared/domain/transport/judge-vessel'
import { judgeWarmth, travelRangeC } from '@/shared/domain/transport/judge-warmth'
import { makesSense } from '@/shared/domain/transport/makes-sense'
import { stepOf } from '@/shared/domain/transport/step-of'
import type { Container, Trip, TripAnswer, TripSide, TripStep } from '@/shared/domain/transport/trip'
import { rankOf, strictest, type Reason } from '@/shared/domain/transport/verdict'
import { waterOnTheWay, type WarmthStep } from '@/shared/domain/transport/water-way'

/** Damp bedding holds a little less heat than water (house rule). */
const BEDDING_L_PER_KG = 0.8
/** House rule: of a box's inside, bags of water and gas fill at most this. */
const FILL_MOST = 0.95
const noPacks = { heat: null, cold: null, hasAirHoles: true }

/**
 * Whether these animals survive this trip, on its cold and on its hot day, and every reason. `unknown`: a source does not
 * reach, or a figure makes no sense. The same function on server and screen.
 */
export function checkTrip(trip: Trip): TripAnswer {
  const hours = trip.legs.reduce((sum, leg) => sum + leg.hours, 0)
  const range = travelRangeC(trip.animals, trip.container, hours)
  if (!range || !makesSense(trip)) return unanswered(hours, 'absurd')
  const cold = sideOf(trip, 'cold', range)
  // Where every leg states its air, both days are the same day.
  const hot = trip.weather === null ? cold : sideOf(trip, 'hot', range)
  if (!cold || !hot) return unanswered(hours, 'absurd')
  const common = [...judgeAnimals(trip.animals, trip.container, hours), ...judgeBox(trip.container)]
  const reasons = withoutTwins([...common, ...cold.reasons, ...hot.reasons])
  return { verdict: strictest(reasons), reasons, hours, loadGPerL: loadOf(trip), cold, hot }
}

function unanswered(hours: number, code: Reason['code']): TripAnswer {
  const reason: Reason = {
    code,
    verdict: 'unknown',
    value: null,
    limit: null,
    atHour: null,
    sourceKey: 'house-rule',
  }
  return { verdict: 'unknown', reasons: [reason], hours, loadGPerL: null, cold: null, hot: null }
}

/** Animals in the fullest bag. */
const inFullestBag = (count: number, bags: number) => Math.ceil(count / bags)

function loadOf({ animals, container }: Trip): number | null {
  if (container.kind === 'bedding') return null
  if (container.kind === 'vessel') return (animals.count * animals.massG) / container.waterL
  return (
    (inFullestBag(animals.count, container.boxes * container.bagsPerBox) * animals.massG) /
    container.waterLPerBag
  )
}

function waterOf(container: Container): number {
  if (container.kind === 'bags') return container.bagsPerBox * container.waterLPerBag
  return container.kind === 'vessel' ? container.waterL : container.beddingKg * BEDDING_L_PER_KG
}

function sideOf(trip: Trip, side: 'cold' | 'hot', range: readonly [number, number]): TripSide | null {
  const { container, water, legs, departHour, weather } = trip
  const lossWPerK = boxLossWPerK(container.box)
  if (lossWPerK === null) return null
  const packs = container.kind === 'vessel' ? noPacks : container.packs
  const way = waterOnTheWay({
    startC: water.startC,
    waterL: waterOf(container),
    lossWPerK,
    packs,
    legs,
    departHour,
    weather,
    side,
  })
  if (way === null || way.length === 0) return null
  const { steps, reasons } = judgeWater(trip, way, side)
  return {
    steps,
    coldest: steps.reduce<TripStep | null>((a, b) => (a && a.waterC <= b.waterC ? a : b), null),
    warmest: steps.reduce<TripStep | null>((a, b) => (a && a.waterC >= b.waterC ? a : b), null),
    reasons: [...judgeWarmth(way, range), ...reasons],
  }
}

function judgeWater(
  trip: Trip,
  way: readonly WarmthStep[],
  side: 'cold' | 'hot',
): { steps: TripStep[]; reasons: Reason[] } {
  const { animals, water, container } = trip
  if (container.kind === 'vessel') return judgeVessel({ animals, water, vessel: container }, way)
  if (container.kind === 'bedding') {
    return { steps: way.map((step) => stepOf(step)), reasons: judgeBedding(trip, container, side) }
  }
  const massG = inFullestBag(animals.count, container.boxes * container.bagsPerBox) * animals.massG
  return judgeBag({ animals, water, bags: container, massG }, way)
}

function judgeBox(container: Container): Reason[] {
  if (container.kind === 'vessel') return []
  const rule = { value: null, limit: null, atHour: null, sourceKey: 'house-rule' } as const
  const { packs, box } = container
  const reasons: Reason[] =
    packs.heat && !packs.hasAirHoles ? [{ code: 'pack-without-air', verdict: 'caution', ...rule }] : []
  if (container.kind === 'bags') {
    const value = container.bagsPerBox * (container.waterLPerBag + container.oxygenLPerBag)
    const limit = ((box.lengthCm * box.widthCm * box.heightCm) / 1000) * FILL_MOST
    if (value > limit) reasons.push({ ...rule, code: 'does-not-fit', verdict: 'unsafe', value, limit })
  }
  return reasons
}

/** The two days often say the same: the stricter, earlier one is kept. Strictest first. */
function withoutTwins(reasons: readonly Reason[]): Reason[] {
  const kept = new Map<string, Reason>()
  for (const reason of reasons) {
    const twin = kept.get(reason.code)
    if (!twin || rankOf(reason.verdict) > rankOf(twin.verdict) || isWorse(reason, twin))
      kept.set(reason.code, reason)
  }
  return [...kept.values()].sort((a, b) => rankOf(b.verdict) - rankOf(a.verdict))
}

const isWorse = (a: Reason, b: Reason) =>
  a.verdict === b.verdict &&
  Math.abs((a.value ?? 0) - (a.limit ?? 0)) > Math.abs((b.value ?? 0) - (b.limit ?? 0))
