import type { Slot } from '@/seed/demo/pickup-times'
import type { Farm } from '@/seed/demo/stage'
import type { ListingBody } from '@/shared/contracts/listings'

/** A photo to take: one of our pictures, framed anew. */
export interface Shot {
  /** In assets/demo. */
  picture: string
  caption?: string
  hasRuler: boolean
  takenOn: string
  /** What the camera's own clock wrote into the file. */
  cameraDay?: string
  /** Framed with these words' chances; the same words give the very same file. */
  framing: string
}

/** A batch on its way to a listing: everything typed into the form but the photos, which are uploaded first. */
export interface BatchPlan {
  key: string
  farm: Farm
  submittedAt: Date
  decidedAt: Date
  body: Omit<ListingBody, 'photos' | 'windows'>
  slots: Slot[]
  shots: Shot[]
}
