import type { BagStage } from '@/shared/domain/transport/bag-loading.facts'
import type { Box } from '@/shared/domain/transport/box'
import type { Leg, Weather } from '@/shared/domain/transport/leg-air'
import type { Packs } from '@/shared/domain/transport/pack-heat'
import type { Reason, Verdict } from '@/shared/domain/transport/verdict'
import type { SpeciesId } from '@/shared/domain/species/species.facts'
import type { SpeciesRecord } from '@/shared/domain/species/species-record'

export interface Animals {
  species: SpeciesRecord<SpeciesId>
  count: number
  /** One animal, g. */
  massG: number
  stage: BagStage
  shortestMm: number | null
  longestMm: number | null
  /** null: nobody said. */
  fastedHours: number | null
}

export interface SourceWater {
  startC: number
  alkalinityMeqPerL: number
  pH: number
}

/** Bags with oxygen in insulated boxes; every box alike. */
export interface BaggedBoxes {
  kind: 'bags'
  boxes: number
  bagsPerBox: number
  waterLPerBag: number
  oxygenLPerBag: number
  isDoubled: boolean
  /** A parcel that stands in a depot is not shaken: its water takes up less oxygen. */
  standsStill: boolean
  box: Box
  packs: Packs
}

/** A bucket, cooler or tank of open water. */
export interface Vessel {
  kind: 'vessel'
  waterL: number
  box: Box
  aeration: 'none' | 'air' | 'oxygen'
}

/** Damp animals or worms in bedding, in a box. */
export interface Bedding {
  kind: 'bedding'
  beddingKg: number
  box: Box
  packs: Packs
}

export type Container = BaggedBoxes | Vessel | Bedding

export interface Trip {
  animals: Animals
  water: SourceWater
  container: Container
  legs: readonly Leg[]
  /** Hour of the day at packing, 0-24, local. */
  departHour: number
  /** null where every leg states its air. */
  weather: Weather | null
}

/** Figures of one moment; null where the container has none (bedding) or aeration decides them. */
export interface TripStep {
  hour: number
  airC: number
  waterC: number
  oxygenMgPerL: number | null
  co2MgPerL: number | null
  tanMgPerL: number | null
  nh3NMgPerL: number | null
}

export interface TripSide {
  steps: readonly TripStep[]
  coldest: TripStep | null
  warmest: TripStep | null
  reasons: readonly Reason[]
}

export interface TripAnswer {
  verdict: Verdict
  /** Strictest first. */
  reasons: readonly Reason[]
  hours: number
  /** g of animals per L of water; null in bedding. */
  loadGPerL: number | null
  cold: TripSide | null
  hot: TripSide | null
}
