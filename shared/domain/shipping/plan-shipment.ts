import {
  packingClasses,
  SEASON_DEPART_HOUR,
  seasonOptionIds,
  seasonOptions,
  type AnimalClassId,
  type PackingClassId,
  type SeasonOption,
} from '@/shared/domain/season/season-classes.facts'
import { animalClassOf } from '@/shared/domain/season/season-lane'
import { filledBox, packedC } from '@/shared/domain/season/season-trip'
import { checkTrip } from '@/shared/domain/transport/check-trip'
import type { Weather } from '@/shared/domain/transport/leg-air'
import type { Animals, SourceWater, Trip, TripAnswer } from '@/shared/domain/transport/trip'
import { rankOf, type Reason } from '@/shared/domain/transport/verdict'

export interface ShipmentTask {
  /** `count`: in all boxes together. */
  animals: Animals
  water: Omit<SourceWater, 'startC'>
  packing: PackingClassId
  boxes: number
  weather: Weather
}

export interface ShipmentPlan {
  option: SeasonOption
  /** Water, or bedding, at packing, °C. */
  startC: number
  animalsPerBox: number
  /** Null in bedding. */
  bagsPerBox: number | null
  /** The fullest box on its way. */
  trip: Trip
  answer: TripAnswer
}

export interface ShipmentAnswer {
  verdict: 'safe' | 'unsafe' | 'unknown'
  /** How to pack; where nothing is safe, the packing that came nearest. */
  plan: ShipmentPlan | null
  /** Remarks and cautions of a safe plan; what speaks against the nearest of unsafe ones. Strictest first. */
  reasons: readonly Reason[]
}

/** What a trip may be and still be sent: a caution is told, and the margins before it are the engine's own. */
const isGood = ({ answer }: ShipmentPlan) => rankOf(answer.verdict) <= rankOf('caution')

/**
 * Packs an order the seller's way (outer box, hours, bags) for one weather: of the warmths and packs of `seasonOptions`
 * the first without any caution on its cold and its hot day, else the one with the fewest. `unknown`: an animal or
 * figure that no source reaches.
 */
export function planShipment(task: ShipmentTask): ShipmentAnswer {
  const animals = animalClassOf(task.animals.species.id)
  if (animals === null) return { verdict: 'unknown', plan: null, reasons: [] }
  const plans = seasonOptionIds.map((option) => planOf(task, animals, option))
  const plan = plans.reduce((best, one) => (isNearer(one.answer, best.answer) ? one : best))
  if (isGood(plan)) return { verdict: 'safe', plan, reasons: plan.answer.reasons }
  const reasons = plan.answer.reasons.filter(({ verdict }) => verdict !== 'safe')
  return { verdict: plan.answer.verdict === 'unknown' ? 'unknown' : 'unsafe', plan, reasons }
}

/**
 * The same long before, by the weather of many years, as the season table has it: the cold day packed for cold and the
 * hot day packed for heat must both go well. `plan` only where one packing does for both: else the forecast decides.
 */
export function planShipmentAhead(task: ShipmentTask): ShipmentAnswer {
  const { origin, destination } = task.weather
  const [forCold, forHeat] = (['cold', 'hot'] as const).map((side) =>
    planShipment({
      ...task,
      weather: {
        origin: { cold: origin[side], hot: origin[side] },
        destination: { cold: destination[side], hot: destination[side] },
      },
    }),
  )
  if (!forCold || !forHeat) return { verdict: 'unknown', plan: null, reasons: [] }
  const bad = [forCold, forHeat].find(({ verdict }) => verdict !== 'safe')
  if (bad) return bad
  const isOne = forCold.plan?.option === forHeat.plan?.option
  return { verdict: 'safe', plan: isOne ? forCold.plan : null, reasons: [] }
}

const isNearer = (a: TripAnswer, b: TripAnswer) =>
  rankOf(a.verdict) < rankOf(b.verdict) || (a.verdict === b.verdict && a.reasons.length < b.reasons.length)

function planOf(task: ShipmentTask, animals: AnimalClassId, option: SeasonOption): ShipmentPlan {
  const { packing, boxes, weather, water } = task
  const { species, count } = task.animals
  const startC = packedC({ animals, option })
  const container = filledBox(species, { packing, option })
  const animalsPerBox = Math.ceil(count / boxes)
  const trip: Trip = {
    animals: { ...task.animals, count: animalsPerBox },
    water: { ...water, startC },
    container,
    legs: packingClasses[packing].legs,
    departHour: SEASON_DEPART_HOUR,
    weather,
  }
  const bagsPerBox = container.kind === 'bags' ? container.bagsPerBox : null
  return { option, startC, animalsPerBox, bagsPerBox, trip, answer: checkTrip(trip) }
}

/** Packs of a plan, in each box. */
export const packsOfPlan = ({ option }: Pick<ShipmentPlan, 'option'>) => seasonOptions[option]
