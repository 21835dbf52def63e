import type { SpeciesId } from '@/shared/domain/species/species.facts'
import type { Box } from '@/shared/domain/transport/box'
import type { Leg } from '@/shared/domain/transport/leg-air'
import type { Packs } from '@/shared/domain/transport/pack-heat'
import type { SourceKey } from '@/shared/sources'

export const seasonSources: readonly SourceKey[] = ['arguez-2012', 'house-rule']

/** Share of trips that must go well: the design days of the trip engine. */
export const SEASON_CONFIDENCE = 0.9

interface AnimalClass {
  /** A table figure for `lane`: never reused, never renumbered. */
  code: number
  species: readonly SpeciesId[]
  /** Water (or bedding) at packing, °C: inside every member's range. House rule. */
  packedC: number
}

// Animals that may travel at the same temperatures share a class; a class is judged by its most delicate member.
// prettier-ignore
export const animalClasses = {
  'tilapia': { code: 1, species: ['nile_tilapia', 'blue_tilapia', 'mozambique_hybrid_tilapia'], packedC: 25 },
  'pond-fish': { code: 2, species: ['bluegill', 'hybrid_bluegill', 'largemouth_bass', 'channel_catfish', 'common_carp_koi', 'goldfish'], packedC: 17 },
  'cool-water-fish': { code: 3, species: ['fathead_minnow', 'golden_shiner', 'hybrid_striped_bass'], packedC: 14 },
  'perch': { code: 4, species: ['yellow_perch'], packedC: 12 },
  'trout': { code: 5, species: ['rainbow_trout'], packedC: 8 },
  'redclaw': { code: 6, species: ['redclaw_crayfish'], packedC: 20 },
  'crawfish': { code: 7, species: ['red_swamp_crayfish'], packedC: 13 },
  'prawn': { code: 8, species: ['freshwater_prawn'], packedC: 22 },
  'worms-and-larvae': { code: 9, species: ['red_wiggler', 'black_soldier_fly_larvae'], packedC: 18 },
  'nightcrawlers': { code: 10, species: ['european_nightcrawler'], packedC: 14 },
} as const satisfies Record<string, AnimalClass>

export type AnimalClassId = keyof typeof animalClasses

interface PackingClass {
  code: number
  box: Box
  legs: readonly Leg[]
  /** Nights on the way: the longer, the colder the coldest of them. */
  nights: number
  /** g of animals per L of water: light enough that weather alone decides. House rule. */
  loadGPerL: number
  packHours: 40 | 72
}

/** Packed at two in the afternoon, handed over at four, there at ten. House rule. */
export const SEASON_DEPART_HOUR = 14
const overnight: readonly Leg[] = [
  { hours: 2, exposure: 'outdoor', end: 'origin' },
  { hours: 2, exposure: 'van', end: 'origin' },
  { hours: 8, exposure: 'depot', end: 'origin' },
  { hours: 6, exposure: 'van', end: 'destination' },
  { hours: 2, exposure: 'outdoor', end: 'destination' },
]
const twoDays: readonly Leg[] = [
  { hours: 2, exposure: 'outdoor', end: 'origin' },
  { hours: 2, exposure: 'van', end: 'origin' },
  { hours: 14, exposure: 'depot', end: 'origin' },
  { hours: 12, exposure: 'van', end: 'destination' },
  { hours: 8, exposure: 'depot', end: 'destination' },
  { hours: 4, exposure: 'van', end: 'destination' },
  { hours: 2, exposure: 'outdoor', end: 'destination' },
]
const inside = { lengthCm: 40, widthCm: 30, heightCm: 25 }
const carton: Box = { ...inside, wallMm: 5, conductivityWPerMK: 0.065 }
const foam = (wallMm: number): Box => ({ ...inside, wallMm, conductivityWPerMK: 0.045 })

/** How a seller ships: outer box and time door to door. */
// prettier-ignore
export const packingClasses = {
  'carton-overnight': { code: 1, box: carton, legs: overnight, nights: 1, loadGPerL: 5, packHours: 40 },
  'foam-25-overnight': { code: 2, box: foam(25), legs: overnight, nights: 1, loadGPerL: 5, packHours: 40 },
  'foam-38-overnight': { code: 3, box: foam(38), legs: overnight, nights: 1, loadGPerL: 5, packHours: 40 },
  'carton-two-days': { code: 4, box: carton, legs: twoDays, nights: 2, loadGPerL: 2, packHours: 72 },
  'foam-25-two-days': { code: 5, box: foam(25), legs: twoDays, nights: 2, loadGPerL: 2, packHours: 72 },
  'foam-38-two-days': { code: 6, box: foam(38), legs: twoDays, nights: 2, loadGPerL: 2, packHours: 72 },
} as const satisfies Record<string, PackingClass>

export type PackingClassId = keyof typeof packingClasses

/** What a table cell tries, in this order: nothing, then packs. */
export type SeasonPacks = 'none' | 'heat-2' | 'heat-4' | 'cold-2' | 'cold-4'

export const seasonPacks: readonly SeasonPacks[] = ['none', 'heat-2', 'heat-4', 'cold-2', 'cold-4']

/** The packs as the trip engine takes them; heat packs of the printed hours that outlast the trip. */
export function packsOf(choice: SeasonPacks, packHours: 40 | 72): Packs {
  if (choice === 'none') return { heat: null, cold: null, hasAirHoles: false }
  const count = choice.endsWith('2') ? 2 : 4
  return choice.startsWith('heat')
    ? { heat: { id: `heat-${packHours}h`, count }, cold: null, hasAirHoles: true }
    : { heat: null, cold: { id: 'cold-450g', count }, hasAirHoles: false }
}
