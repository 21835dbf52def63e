import type { MediaBody } from '@/shared/contracts/media-lot'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import type { WormBody } from '@/shared/contracts/worm-lot'

/** A listing's body of anything but fish. */
export type SupplyBody = ProduceBody | WormBody | MediaBody

export function SupplyFacts({ body }: { body: SupplyBody }) {
  return body.category === 'produce' ? null : null
}
