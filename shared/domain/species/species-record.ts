import type { SourceKey } from '@/shared/sources'

/** Lower and upper end of a published or recommended range. */
export type Range = readonly [number, number]

export type ThermalClass = 'cold' | 'cool' | 'warm' | 'tropical' | 'eurythermal'

/** Which published oxygen-use model stands for the species; several are stand-ins from a related animal. */
export type OxygenModel =
  | 'tilapia-adult'
  | 'bluegill-juvenile'
  | 'perch-juvenile'
  | 'bass-adult'
  | 'brown-bullhead'
  | 'trout-adult'
  | 'roach'
  | 'fathead'
  | 'striped-bass-young'
  | 'rusty-crayfish'

/** W in g = fultonK * L³ / 100, L total length in cm. */
export interface LengthWeight {
  fultonK: number
  confidence: 'high' | 'medium' | 'low'
  from: string
}

/** log10 W(g) = a + b·x + c·x², x = log10 of total length in mm; 75th-percentile wild fish, not hatchery fish. */
export interface StandardWeight {
  a: number
  b: number
  c: number
  leastMm: number
  mostMm: number | null
  author: string
}

/** null anywhere: not applicable to the animal, or nobody says. Temperatures °C, water figures mg/L, masses g. */
export interface SpeciesRecord<Id extends string = string> {
  /** Small integer for tables and indexes; never reused, never renumbered. */
  speciesCode: number
  id: Id
  commonName: string
  scientificName: string
  kind: 'fish' | 'crustacean' | 'worm' | 'insect'
  thermalClass: ThermalClass
  optimumC: Range
  feedC: Range
  stressC: Range
  /** Dies below or above. Knock-down points are wider still: never ship by these. */
  lethalC: Range
  /** Water temperature at packing and through the trip; our recommendation. */
  shipWaterC: Range | null
  /** Air temperature in the parcel of animals that travel without water. */
  shipAirC: Range | null
  travels: 'in-water' | 'damp' | 'in-bedding'
  goodOxygenMgPerL: number | null
  leastOxygenMgPerL: number | null
  survivesOxygenMgPerL: number | null
  pH: Range | null
  /** Un-ionised ammonia as N. */
  uiaChronicMgPerL: number | null
  uiaKillMgPerL: number | null
  tanMostMgPerL: number | null
  nitriteMostMgPerL: number | null
  chlorideProtects: boolean | null
  chlorideToNitriteLeast: number | null
  saltMostPpt: number | null
  hardnessLeastMgPerL: number | null
  lengthWeight: LengthWeight | null
  standardWeight: StandardWeight | null
  marketG: Range | null
  /** Thermal growth coefficient × 1000. */
  tgcX1000: Range | null
  tgcFrom: string | null
  /** Months 1-12 in which US hatcheries usually have them; from memory for all species. */
  fingerlingMonths: readonly number[]
  spawnLeastC: number | null
  spawnBestC: number | null
  hatchDegreeDaysC: Range | null
  temper: string | null
  /** Largest over smallest total length that may share a bag or tank; our recommendation. */
  sizeRatioMost: number | null
  fastHours: number | null
  oxygenModel: OxygenModel | null
  countPerLb: Range | null
  countPerLbUsual: number | null
  legalNote: string | null
  confidence: string
  sourceKeys: readonly SourceKey[]
}
