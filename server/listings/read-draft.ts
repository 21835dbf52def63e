import { fieldProblems } from '@/server/http/field-problems'
import { Problem } from '@/shared/api/problem'
import { listingBody, type ListingBody, type ListingDraft } from '@/shared/contracts/listings'
import { matchCrop } from '@/shared/domain/produce/find-crop'
import { fillSellBy } from '@/server/listings/fill-sell-by'

/** A crop by any of its names is the crop: 'kangkong' is water spinach, whoever sends it. */
function withCrop(draft: ListingDraft): ListingDraft {
  if (draft.category !== 'produce' || typeof draft.cropId !== 'string') return draft
  const crop = matchCrop(draft.cropId)
  return crop ? { ...draft, cropId: crop.id } : draft
}

/** The draft as a whole batch, or every field that is not right yet, at its place in the form. */
export function readDraft(draft: ListingDraft): ListingBody {
  const read = listingBody.safeParse(withCrop(draft))
  if (read.success) return fillSellBy(read.data)
  const errors = fieldProblems(read.error, '#').map(({ detail, pointer }) => ({
    detail,
    pointer: pointer.replace('#/', '#/draft/'),
  }))
  throw new Problem('listing-incomplete', undefined, { errors })
}
