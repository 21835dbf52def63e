import type { Slot } from '@/seed/demo/pickup-times'
import type { Farm } from '@/seed/demo/stage'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { MediaBody } from '@/shared/contracts/media-lot'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import type { WormBody } from '@/shared/contracts/worm-lot'

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

/** As typed, but for the photos, which are uploaded first, and the windows, which follow from the slots. */
type Typed<Body> = Omit<Body, 'photos' | 'windows'>

/** What anybody sells, on its way to a listing. */
export interface LotPlan {
  key: string
  farm: Farm
  submittedAt: Date
  decidedAt: Date
  body: Typed<FishBody> | Typed<WormBody> | Typed<MediaBody> | Typed<ProduceBody>
  slots: Slot[]
  shots: Shot[]
}

/** A batch of fish, crayfish or prawns. */
export interface BatchPlan extends LotPlan {
  body: Typed<FishBody>
}
