import type { DesignWeather } from '@/shared/domain/climate/design-weather'
import { animalClasses } from '@/shared/domain/season/season-classes.facts'
import { dayOfLevel, LEVELS } from '@/shared/domain/season/season-scale'
import { scaleOf, type WeekDay } from '@/shared/domain/season/season-table'
import { packedC, seasonTrip, type SeasonPacking } from '@/shared/domain/season/season-trip'
import { findSpecies } from '@/shared/domain/species/find-species'
import { checkTrip } from '@/shared/domain/transport/check-trip'
import type { Reason } from '@/shared/domain/transport/verdict'

const coldCodes: readonly Reason['code'][] = ['too-cold', 'nearly-too-cold', 'freezes', 'air-too-cold']

/** A change of temperature speaks against the cold when the water fell, against the heat when it rose. */
function isOfCold({ code, value }: Reason, startC: number): boolean {
  return code === 'changes-too-far' ? (value ?? 0) < startC : coldCodes.includes(code)
}

function membersOf({ animals }: SeasonPacking) {
  return animalClasses[animals].species.map((id) => {
    const species = findSpecies(id)
    if (!species) throw new Error(`${id} has left the species facts`)
    return species
  })
}

/** Whether a class can be answered for at all: in weather of its own warmth nothing about it is unknown. */
export function isAnswered(packing: SeasonPacking): boolean {
  const mild = { minC: packedC(packing) - 4, maxC: packedC(packing) - 2 }
  const weather: DesignWeather = { cold: mild, hot: mild }
  return membersOf(packing).every((species) =>
    checkTrip(seasonTrip(species, packing, { origin: weather, destination: weather })).reasons.every(
      ({ verdict }) => verdict !== 'unknown',
    ),
  )
}

/** Whether days of these levels leave every member safe: cold days at their harshest and at their mildest, and hot days. */
export function bears(packing: SeasonPacking, day: WeekDay, [from, to]: readonly [number, number]): boolean {
  const scale = scaleOf[day]
  const side = day === 'cold' || day === 'mildCold' ? 'cold' : 'hot'
  const [here, there] = [dayOfLevel(scale, from), dayOfLevel(scale, to)]
  const weather = { origin: { cold: here, hot: here }, destination: { cold: there, hot: there } }
  return membersOf(packing).every((species) =>
    checkTrip(seasonTrip(species, packing, weather))[side]?.reasons.every(
      (reason) => reason.verdict === 'safe' || isOfCold(reason, packedC(packing)) !== (scale === 'cold'),
    ),
  )
}

/**
 * For each level at the origin the harshest level at the destination that leaves all members safe; null: none does. Milder
 * air never makes it worse, so the limit is followed downwards from the mildest origin.
 */
export function limitsOf(packing: SeasonPacking, day: WeekDay): (number | null)[] {
  const limits: (number | null)[] = Array.from({ length: LEVELS }, () => null)
  let least = 0
  for (let from = LEVELS - 1; from >= 0; from--) {
    while (least < LEVELS && !bears(packing, day, [from, least])) least++
    if (least === LEVELS) break
    limits[from] = least
  }
  return limits
}
