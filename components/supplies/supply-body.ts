import type { MediaBody } from '@/shared/contracts/media-lot'
import type { ProduceBody } from '@/shared/contracts/produce-lot'
import type { WormBody } from '@/shared/contracts/worm-lot'

/** The body of a listing of anything but fish. */
export type SupplyBody = ProduceBody | WormBody | MediaBody
