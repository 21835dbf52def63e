import type { SearchQuery } from '@/server/search/search-query'
import type { MadeListings } from '@/tests/bench/made-listings'
import type { Shape } from '@/tests/bench/make-query'

export interface PeerHit {
  distanceKm: number
  unitCents: number
}

/** Another way of answering the same questions, measured beside ours in the same run. */
export interface Peer {
  name: string
  /** Shapes it can answer. */
  shapes: readonly Shape[]
  /** Asked every so many questions only: slow ways would eat the run. */
  every: number
  /** Its rows are checked like ours; null: it answers nothing (a yardstick of the round trip). */
  find: (query: SearchQuery) => Promise<PeerHit[] | null>
  close: () => Promise<void>
}

export interface PeerGround {
  made: MadeListings
  ownerUrl: string
  /** What a slower way is asked: every so many questions, by the number of listings. */
  seldom: number
}

/** Gets ready, or says why it is not measured here. */
export type OpenPeer = (ground: PeerGround) => Promise<Peer | { skipped: string }>
