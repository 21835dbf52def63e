import type { CellPoint } from '@/shared/domain/geo/location-cell'

/** From so many on, one costs so much. */
export interface SearchTier {
  fromCount: number
  unitCents: number
}

/** Not rated yet: after every rated seller. */
export const UNRATED_RANK = 501
/** Not of a kind that has a length: fits every size asked for. */
export const ANY_SIZE_MM = { lo: 0, hi: 65_535 } as const

/** Every fact that search tests about one listing that may be found now. */
export interface SearchRow {
  listingId: number
  sellerId: number
  categoryCode: number
  /** 0: names no species. */
  speciesCode: number
  /** Centre of the seller's location cell: search never knows a finer place. */
  place: CellPoint
  /** Free to order now. */
  qty: number
  minQty: number
  /** One to eight, counts rising and prices falling; the first holds from the smallest order on. */
  tiers: readonly SearchTier[]
  sizeLoMm: number
  sizeHiMm: number
  nextDay: number
  lastDay: number
  openDays: bigint
  pickup: boolean
  /** Way of shipping, `NO_LANE` where not shipped. */
  lane: number
  /** One bit a state that it is shipped to; none where not shipped. */
  shipStates: bigint
  hiddenStates: bigint
  ratingRank: number
  /** Grows with every change of the listing. */
  rev: number
}
