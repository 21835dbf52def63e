import type { SourceKey } from '@/shared/sources'

interface HeatPack {
  /** Hours printed on the pack. */
  ratedHours: number
  /** What we count on; nobody publishes it. Half of what the iron in a pack could give. */
  watts: number
  priceCents: number
}

interface ColdPack {
  kg: number
  priceCents: number
}

export const packSource: SourceKey = 'house-rule'

/** Air-activated heat packs of the trade, by the hours on them. Prices are round figures to plan by. */
export const heatPacks = {
  'heat-24h': { ratedHours: 24, watts: 4, priceCents: 150 },
  'heat-40h': { ratedHours: 40, watts: 3, priceCents: 175 },
  'heat-72h': { ratedHours: 72, watts: 3, priceCents: 250 },
} as const satisfies Record<string, HeatPack>

/** Frozen gel packs. */
export const coldPacks = {
  'cold-450g': { kg: 0.45, priceCents: 150 },
} as const satisfies Record<string, ColdPack>

export type HeatPackId = keyof typeof heatPacks
export type ColdPackId = keyof typeof coldPacks
