import type { SaleUnitKind } from '@/shared/domain/listings/sale-unit'
import type { Range } from '@/shared/domain/species/species-record'
import type { TaxonId } from '@/shared/domain/species/taxa.facts'
import type { SourceKey } from '@/shared/sources'

export type CropGroup = 'lettuce' | 'greens' | 'herb' | 'microgreen' | 'onion' | 'fruit' | 'berry'

/** How long a crop keeps, whole, between two temperatures. */
export interface KeepingTime {
  fromC: number
  toC: number
  /** Shortest and longest that the source says. */
  days: Range
  sourceKey: SourceKey
}

/** null anywhere: nobody says. */
export interface Crop {
  id: string
  name: string
  group: CropGroup
  alsoCalled: readonly string[]
  /** Only where the species gate has something to say about the plant. */
  taxonId: TaxonId | null
  storeC: Range | null
  humidityPct: Range | null
  keeps: readonly KeepingTime[]
  /** Colder than this harms it. null: it bears the cold, or nobody says. */
  chillsBelowC: number | null
  /** Methods of sale, the usual one first. */
  soldBy: readonly SaleUnitKind[]
  /** A bunch must also say its net weight, where the chart knows the crop by weight alone. */
  bunchNeedsWeight: boolean
  /** Cut leafy greens: once cut after the harvest they are kept at 41 °F or colder. */
  isLeafyGreen: boolean
  sourceKeys: readonly SourceKey[]
}
