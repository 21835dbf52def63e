import type { Box } from '@/shared/domain/transport/box'
import type { SourceKey } from '@/shared/sources'

export const packingSources: readonly SourceKey[] = ['mx392', 'piper-1982', 'house-rule']

/** Foam in a bag-lined, wet box. */
const WET_FOAM_W_PER_M_K = 0.045

export interface BoxSize {
  id: string
  box: Box
  priceCents: number
}

export interface BagSize {
  id: string
  waterL: number
  /** Three parts of oxygen to one of water, as for trips past 12 hours. */
  oxygenL: number
  priceCents: number
}

const foam = (lengthCm: number, widthCm: number, heightCm: number) => (wallMm: number) => ({
  lengthCm,
  widthCm,
  heightCm,
  wallMm,
  conductivityWPerMK: WET_FOAM_W_PER_M_K,
})

/** Usual sizes, inside; prices are round figures to plan by. Whoever packs edits the list. */
export const usualBoxes: readonly BoxSize[] = [
  { id: 'small-25', box: foam(30, 25, 20)(25), priceCents: 600 },
  { id: 'middle-25', box: foam(40, 30, 25)(25), priceCents: 900 },
  { id: 'middle-38', box: foam(40, 30, 25)(38), priceCents: 1200 },
  { id: 'large-38', box: foam(60, 40, 30)(38), priceCents: 2200 },
]

/** Usual bags, each doubled. The larger is the 18 × 32 in bag with 6 of the 5.7 to 7.6 L it may hold. */
export const usualBags: readonly BagSize[] = [
  { id: 'small', waterL: 2.5, oxygenL: 7.5, priceCents: 80 },
  { id: 'usual', waterL: 6, oxygenL: 18, priceCents: 150 },
]
