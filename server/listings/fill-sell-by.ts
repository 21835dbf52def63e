import type { ListingBody } from '@/shared/contracts/listings'
import { findCrop } from '@/shared/domain/produce/find-crop'
import { sellBy } from '@/shared/domain/produce/sell-by'

/** The last day of sale is kept with the listing, also where it was reckoned: the tables behind it may change. */
export function fillSellBy(body: ListingBody): ListingBody {
  if (body.category !== 'produce' || body.sellBy !== undefined) return body
  const { cropId, form, harvest, handling } = body
  const crop = findCrop(cropId)
  const reckoned = crop && sellBy({ crop, form, harvestDay: harvest.day, heldC: handling.heldC })
  return reckoned ? { ...body, sellBy: reckoned.day } : body
}
