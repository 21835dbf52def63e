import type { searchSorts } from '@/shared/contracts/search'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

export type SearchSort = (typeof searchSorts)[number]

/** Where one page ended: everything after it comes strictly later in the order asked for. */
export interface SearchKey {
  /** Cents, day or rating rank of the last hit; for `nearest` the same as `dm2`. */
  by: number
  /** Squared chord of the last hit. */
  dm2: number
  listingId: number
  /** Hits on all pages so far: what a walk from the beginning would have to pass again. */
  seen: number
}

/** What is asked of search, in codes and whole units, already checked. Absent: no such wish. */
export interface SearchQuery {
  /** Centre of the buyer's location cell. */
  origin: CellPoint
  radiusKm: number
  categoryCode?: number
  speciesCode?: number
  /** Overlaps the size range of the batch. */
  sizeMm?: { from: number; to: number }
  /** Within what is left and not below the smallest order. Prices are for this count; else for the smallest order. */
  count?: number
  /** Days since 2020-01-01; can be had on at least one of them. */
  days?: { from: number; until: number }
  /** The most that one may cost at the count asked. */
  mostCents?: number
  /** Can be collected, if `pickup`, or goes by one of the lanes. */
  handover?: { pickup: boolean; lanes: readonly number[] }
  /** Is shipped to that state, by one of these lanes. */
  shipped?: { lanes: readonly number[]; state: string }
  /** Two letters: leaves out what must not be shown there. */
  buyerState?: string
  sort: SearchSort
  after?: SearchKey
  limit: number
}

export interface SearchHit {
  listingId: number
  distanceKm: number
  /** For one, at the count asked or at the smallest order. */
  unitCents: number
}

export interface SearchPage {
  hits: SearchHit[]
  /** null: that was the last page. */
  next: SearchKey | null
  /** Round trips to the database; measured, not shown. */
  trips: number
}
