import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import { massForLoadG } from '@/shared/domain/animals/length-to-mass'
import { findSpecies } from '@/shared/domain/species/find-species'
import { usualBags, usualBoxes } from '@/shared/domain/transport/packing.facts'
import type { PackingTask } from '@/shared/domain/transport/plan-packing'

/** A parcel as it is typed: lengths mm, temperatures °C, hours. */
export interface Parcel {
  species: string
  count: number
  lengthMm: number
  fastedHours: number
  startC: number
  pH: number
  hours: number
  /** Air around the box: the coldest and the hottest it will meet. */
  coldC: number
  hotC: number
}

const MORNING = 8
const flat = (airC: number) => ({ minC: airC, maxC: airC })

/** What the packing sheet is asked for with. null: no figures for this animal at this length. */
export function sheetAskOf(parcel: Parcel): ParsedBody<Endpoints['makePackingSheet']> | null {
  const record = findSpecies(parcel.species)
  const massG = record && massForLoadG(record, parcel.lengthMm)
  if (!massG) return null
  const { species, count, lengthMm, fastedHours, startC, pH, hours, coldC, hotC } = parcel
  const days = { cold: flat(coldC), hot: flat(hotC) }
  return {
    ...{ species, count, massG, fastedHours, startC, pH },
    stage: 'fingerling',
    shortestMm: lengthMm,
    longestMm: lengthMm,
    alkalinityMeqPerL: 2,
    legs: [{ hours, exposure: 'outdoor', end: 'origin' }],
    departHour: MORNING,
    weather: { origin: days, destination: days },
    standsStill: true,
  }
}

/** The same as the packing search reads it. */
export function taskOf(parcel: Parcel): PackingTask | null {
  const asked = sheetAskOf(parcel)
  const species = findSpecies(parcel.species)
  if (!asked || !species) return null
  const { count, massG, stage, shortestMm, longestMm, fastedHours } = asked
  const { startC, alkalinityMeqPerL, pH, legs, departHour, weather, standsStill } = asked
  return {
    animals: { species, count, massG, stage, shortestMm, longestMm, fastedHours },
    water: { startC, alkalinityMeqPerL, pH },
    ...{ legs, departHour, weather, standsStill },
    boxSizes: usualBoxes,
    bagSizes: usualBags,
  }
}
