import {
  animalClasses,
  packingClasses,
  type AnimalClassId,
  type PackingClassId,
} from '@/shared/domain/season/season-classes.facts'
import type { SpeciesId } from '@/shared/domain/species/species.facts'

/** In a search row: not shipped. */
export const NO_LANE = 0

const CLASSES = 16
const PACKINGS = 8

export interface LaneParts {
  /** Climate band of the place it is shipped from. */
  origin: number
  animals: AnimalClassId
  packing: PackingClassId
}

/** One small integer for origin band × animal class × packing class, from 1; a search row's `lane`. */
export function laneOf({ origin, animals, packing }: LaneParts): number {
  const { code } = animalClasses[animals]
  return 1 + (origin * CLASSES + code) * PACKINGS + packingClasses[packing].code
}

/** Band that a lane is shipped from: the inverse of `laneOf`. -1: `NO_LANE`. */
export const originOfLane = (lane: number): number => Math.floor((lane - 1) / (CLASSES * PACKINGS))

/** Class of an animal for the season. null: an animal we hold no class for. */
export function animalClassOf(species: SpeciesId): AnimalClassId | null {
  return animalClassIds.find((id) => animalClasses[id].species.some((member) => member === species)) ?? null
}

export const animalClassIds = Object.keys(animalClasses) as AnimalClassId[]
export const packingClassIds = Object.keys(packingClasses) as PackingClassId[]
