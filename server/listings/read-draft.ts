import { fieldProblems } from '@/server/http/field-problems'
import { Problem } from '@/shared/api/problem'
import { listingBody, type ListingBody, type ListingDraft } from '@/shared/contracts/listings'

/** The draft as a whole batch, or every field that is not right yet, at its place in the form. */
export function readDraft(draft: ListingDraft): ListingBody {
  const read = listingBody.safeParse(draft)
  if (read.success) return read.data
  const errors = fieldProblems(read.error, '#').map(({ detail, pointer }) => ({
    detail,
    pointer: pointer.replace('#/', '#/draft/'),
  }))
  throw new Problem('listing-incomplete', undefined, { errors })
}
