import type { SpeciesId } from '@/shared/domain/species/species.facts'
import type { Box } from '@/shared/domain/transport/box'
import type { Leg } from '@/shared/domain/transport/leg-air'
import type { SourceKey } from '@/shared/sources'

export const seasonSources: readonly SourceKey[] = ['arguez-2012', 'house-rule']

/** Share of trips that must go well: the design days of the trip engine. */
export const SEASON_CONFIDENCE = 0.9

/** How warm the water (or bedding) is made before packing: each for its own weather. */
export type PackedWarmth = 'cool' | 'middle' | 'warm'

interface AnimalClass {
  /** A table figure for `lane`: never reused, never renumbered. */
  code: number
  species: readonly SpeciesId[]
  /** °C at packing, inside every member's range. House rule. */
  packedC: Readonly<Record<PackedWarmth, number>>
}

// Animals that may travel at the same temperatures share a class; a class is judged by its most delicate member.
// prettier-ignore
export const animalClasses = {
  'tilapia': { code: 1, species: ['nile_tilapia', 'blue_tilapia', 'mozambique_hybrid_tilapia'], packedC: { cool: 23, middle: 25, warm: 27 } },
  'sunfish-and-bass': { code: 2, species: ['bluegill', 'hybrid_bluegill', 'largemouth_bass', 'goldfish'], packedC: { cool: 14, middle: 17, warm: 20 } },
  'catfish-and-koi': { code: 3, species: ['channel_catfish', 'common_carp_koi'], packedC: { cool: 15, middle: 17, warm: 20 } },
  'cool-water-fish': { code: 4, species: ['fathead_minnow', 'golden_shiner', 'hybrid_striped_bass'], packedC: { cool: 11, middle: 14, warm: 17 } },
  'perch': { code: 5, species: ['yellow_perch'], packedC: { cool: 9, middle: 12, warm: 15 } },
  'trout': { code: 6, species: ['rainbow_trout'], packedC: { cool: 6, middle: 8, warm: 10 } },
  'redclaw': { code: 7, species: ['redclaw_crayfish'], packedC: { cool: 18, middle: 20, warm: 22 } },
  'crawfish': { code: 8, species: ['red_swamp_crayfish'], packedC: { cool: 9, middle: 13, warm: 17 } },
  'prawn': { code: 9, species: ['freshwater_prawn'], packedC: { cool: 21, middle: 22, warm: 23 } },
  'worms-and-larvae': { code: 10, species: ['red_wiggler', 'black_soldier_fly_larvae'], packedC: { cool: 14, middle: 18, warm: 22 } },
  'nightcrawlers': { code: 11, species: ['european_nightcrawler'], packedC: { cool: 9, middle: 14, warm: 19 } },
} as const satisfies Record<string, AnimalClass>

export type AnimalClassId = keyof typeof animalClasses

interface PackingClass {
  code: number
  box: Box
  /** Usual bags of 7.5 L of water and 15 L of oxygen in the box, or as many lots of 4 kg of bedding. */
  fillings: number
  legs: readonly Leg[]
  /** Nights on the way: the more, the colder the coldest of them. */
  nights: 1 | 2
  /** g of animals per L of water: light enough that weather alone decides. House rule. */
  loadGPerL: number
  packHours: 40 | 72
}

/** Packed at three in the afternoon, handed over at four, there at nine. House rule. */
export const SEASON_DEPART_HOUR = 15
const overnight: readonly Leg[] = [
  { hours: 1, exposure: 'outdoor', end: 'origin' },
  { hours: 2, exposure: 'van', end: 'origin' },
  { hours: 8, exposure: 'depot', end: 'origin' },
  { hours: 6, exposure: 'van', end: 'destination' },
  { hours: 1, exposure: 'outdoor', end: 'destination' },
]
const twoDays: readonly Leg[] = [
  { hours: 1, exposure: 'outdoor', end: 'origin' },
  { hours: 2, exposure: 'van', end: 'origin' },
  { hours: 14, exposure: 'depot', end: 'origin' },
  { hours: 10, exposure: 'van', end: 'destination' },
  { hours: 10, exposure: 'depot', end: 'destination' },
  { hours: 4, exposure: 'van', end: 'destination' },
  { hours: 1, exposure: 'outdoor', end: 'destination' },
]
const middle = { lengthCm: 40, widthCm: 30, heightCm: 25 }
const large = { lengthCm: 60, widthCm: 40, heightCm: 30 }
const carton: Box = { ...middle, wallMm: 5, conductivityWPerMK: 0.065 }
const thinFoam: Box = { ...middle, wallMm: 25, conductivityWPerMK: 0.045 }
const thickFoam: Box = { ...large, wallMm: 38, conductivityWPerMK: 0.045 }

/** How a seller ships: outer box and time door to door. */
// prettier-ignore
export const packingClasses = {
  'carton-overnight': { code: 1, box: carton, fillings: 1, legs: overnight, nights: 1, loadGPerL: 5, packHours: 40 },
  'foam-25-overnight': { code: 2, box: thinFoam, fillings: 1, legs: overnight, nights: 1, loadGPerL: 5, packHours: 40 },
  'foam-38-overnight': { code: 3, box: thickFoam, fillings: 3, legs: overnight, nights: 1, loadGPerL: 5, packHours: 40 },
  'carton-two-days': { code: 4, box: carton, fillings: 1, legs: twoDays, nights: 2, loadGPerL: 2, packHours: 72 },
  'foam-25-two-days': { code: 5, box: thinFoam, fillings: 1, legs: twoDays, nights: 2, loadGPerL: 2, packHours: 72 },
  'foam-38-two-days': { code: 6, box: thickFoam, fillings: 3, legs: twoDays, nights: 2, loadGPerL: 2, packHours: 72 },
} as const satisfies Record<string, PackingClass>

export type PackingClassId = keyof typeof packingClasses

export interface SeasonPacks {
  kind: 'none' | 'heat' | 'cold'
  /** In each box. */
  count: number
  packedAt: PackedWarmth
}

/** What a seller may put in for the weather that is forecast, tried in this order. */
export const seasonOptions = {
  'none-middle': { kind: 'none', count: 0, packedAt: 'middle' },
  'none-warm': { kind: 'none', count: 0, packedAt: 'warm' },
  'none-cool': { kind: 'none', count: 0, packedAt: 'cool' },
  'heat-2': { kind: 'heat', count: 2, packedAt: 'middle' },
  'heat-4': { kind: 'heat', count: 4, packedAt: 'middle' },
  'heat-4-warm': { kind: 'heat', count: 4, packedAt: 'warm' },
  'cold-2': { kind: 'cold', count: 2, packedAt: 'cool' },
  'cold-4': { kind: 'cold', count: 4, packedAt: 'cool' },
} as const satisfies Record<string, SeasonPacks>

export type SeasonOption = keyof typeof seasonOptions
export const seasonOptionIds = Object.keys(seasonOptions) as SeasonOption[]
