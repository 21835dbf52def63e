import type { PhotoSending } from '@/components/forms/batch/use-batch-photos'
import type { ListingDraft } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'
import type { UnitSystem } from '@/shared/units/unit-system'

import type { SupplyTyping } from './supply-typing'

/** What every group may need beside the form itself. */
export interface SupplySetting {
  farm: OwnSeller
  units: UnitSystem
  /** Today and the time by the clock at the farm. */
  today: string
  now: string
  photos: PhotoSending
  /** A version has been approved before: the stock now keeps the count. */
  isOnSale: boolean
  readDraft: (typing: SupplyTyping) => ListingDraft
}
