import {
  packsOf,
  SEASON_DEPART_HOUR,
  animalClasses,
  packingClasses,
  type AnimalClassId,
  type PackingClassId,
  type SeasonPacks,
} from '@/shared/domain/season/season-classes.facts'
import type { SpeciesId } from '@/shared/domain/species/species.facts'
import type { SpeciesRecord } from '@/shared/domain/species/species-record'
import { USUAL_ALKALINITY_MEQ_PER_L } from '@/shared/domain/transport/bag-equations.facts'
import type { Weather } from '@/shared/domain/transport/leg-air'
import type { Container, Trip } from '@/shared/domain/transport/trip'

/** Fingerlings of 5 g, unless said otherwise by the class; one usual bag, or 4 kg of bedding. House rules. */
const MASS_G = 5
const WATER_L = 6
const OXYGEN_L = 18
const BEDDING_KG = 4

export interface SeasonPacking {
  animals: AnimalClassId
  packing: PackingClassId
  packs: SeasonPacks
}

/** The trip that a cell of the season table stands for: a light load, so that the weather alone decides. */
export function seasonTrip(
  species: SpeciesRecord<SpeciesId>,
  { animals, packing, packs: choice }: SeasonPacking,
  weather: Weather,
): Trip {
  const { box, legs, loadGPerL, packHours } = packingClasses[packing]
  const packs = packsOf(choice, packHours)
  const isWet = species.travels === 'in-water'
  const container: Container = isWet
    ? {
        kind: 'bags',
        boxes: 1,
        bagsPerBox: 1,
        waterLPerBag: WATER_L,
        oxygenLPerBag: OXYGEN_L,
        isDoubled: true,
        standsStill: true,
        box,
        packs,
      }
    : { kind: 'bedding', beddingKg: BEDDING_KG, box, packs }
  return {
    animals: {
      species,
      count: Math.round((loadGPerL * WATER_L) / MASS_G),
      massG: MASS_G,
      stage: 'fingerling',
      shortestMm: null,
      longestMm: null,
      fastedHours: species.fastHours,
    },
    water: { startC: animalClasses[animals].packedC, alkalinityMeqPerL: USUAL_ALKALINITY_MEQ_PER_L, pH: 7.5 },
    container,
    legs,
    departHour: SEASON_DEPART_HOUR,
    weather,
  }
}
