import {
  animalClasses,
  packingClasses,
  SEASON_DEPART_HOUR,
  seasonOptions,
  type AnimalClassId,
  type PackingClassId,
  type SeasonOption,
} from '@/shared/domain/season/season-classes.facts'
import type { SpeciesId } from '@/shared/domain/species/species.facts'
import type { SpeciesRecord } from '@/shared/domain/species/species-record'
import { USUAL_ALKALINITY_MEQ_PER_L } from '@/shared/domain/transport/bag-equations.facts'
import type { Weather } from '@/shared/domain/transport/leg-air'
import type { Packs } from '@/shared/domain/transport/pack-heat'
import type { Container, Trip, Vessel } from '@/shared/domain/transport/trip'

/** Fingerlings of 5 g in usual bags, or lots of bedding. House rules. */
const MASS_G = 5
const WATER_L = 7.5
const OXYGEN_L = 15
const BEDDING_KG = 4

export interface SeasonPacking {
  animals: AnimalClassId
  packing: PackingClassId
  option: SeasonOption
}

/** The usual filling of a packed box: bags of water and oxygen, or damp bedding. */
export function filledBox(
  species: SpeciesRecord<SpeciesId>,
  { packing, option }: Pick<SeasonPacking, 'packing' | 'option'>,
): Exclude<Container, Vessel> {
  const { box, fillings, packHours } = packingClasses[packing]
  const packs = packsOf(option, packHours)
  if (species.travels !== 'in-water') return { kind: 'bedding', beddingKg: fillings * BEDDING_KG, box, packs }
  return {
    kind: 'bags',
    boxes: 1,
    bagsPerBox: fillings,
    waterLPerBag: WATER_L,
    oxygenLPerBag: OXYGEN_L,
    isDoubled: true,
    standsStill: true,
    box,
    packs,
  }
}

function packsOf(option: SeasonOption, hours: 40 | 72): Packs {
  const { kind, count } = seasonOptions[option]
  return {
    heat: kind === 'heat' ? { id: `heat-${hours}h`, count } : null,
    cold: kind === 'cold' ? { id: 'cold-450g', count } : null,
    hasAirHoles: kind === 'heat',
  }
}

/** Water (or bedding) at packing, °C. */
export function packedC({ animals, option }: Pick<SeasonPacking, 'animals' | 'option'>): number {
  return animalClasses[animals].packedC[seasonOptions[option].packedAt]
}

/** The trip that a cell of the season table stands for: a light load, so that the weather alone decides. */
export function seasonTrip(
  species: SpeciesRecord<SpeciesId>,
  packing: SeasonPacking,
  weather: Weather,
): Trip {
  const { fillings, legs, loadGPerL } = packingClasses[packing.packing]
  return {
    animals: {
      species,
      count: fillings * Math.floor((loadGPerL * WATER_L) / MASS_G),
      massG: MASS_G,
      stage: 'fingerling',
      shortestMm: null,
      longestMm: null,
      fastedHours: species.fastHours,
    },
    water: { startC: packedC(packing), alkalinityMeqPerL: USUAL_ALKALINITY_MEQ_PER_L, pH: 7.5 },
    container: filledBox(species, packing),
    legs,
    departHour: SEASON_DEPART_HOUR,
    weather,
  }
}
