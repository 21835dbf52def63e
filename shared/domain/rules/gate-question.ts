import type { SpeciesRule } from '@/shared/domain/rules/species-rule'
import type { TaxonLineage } from '@/shared/domain/species/trace-lineage'

export type Viewer = 'visitor' | 'buyer' | 'seller' | 'staff'
export type PaperHolder = 'seller' | 'buyer'

export interface GateQuestion {
  taxon: TaxonLineage
  rules: readonly SpeciesRule[]
  /** Two-letter codes. */
  sellerState: string
  /** Where the animals change hands: the pickup place, or the door they are shipped to. */
  handOverState: string
  buyerState: string
  crossesLine: boolean
  /** ISO day. */
  today: string
  viewer: Viewer
  /** Whose permit papers for this order have been accepted; nobody's when absent. */
  acceptedPapers?: readonly PaperHolder[]
}
