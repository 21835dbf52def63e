import type { ListingDraft } from '@/shared/contracts/listings'

// Said about one batch on one day: the next batch needs its own.
const ABOUT_THIS_BATCH = [
  'hatchedOn',
  'readyOn',
  'countOnHand',
  'singleSpeciesChecked',
  'windows',
  'photos',
  'health',
  'harvest',
  'lotCode',
  'sellBy',
  'lotChecked',
]

/** A draft for the next batch like this one: terms and words stay, statements about the animals themselves do not. */
export function copyDraft(draft: ListingDraft): ListingDraft {
  const copy = Object.fromEntries(
    Object.entries(draft).filter(([field]) => !ABOUT_THIS_BATCH.includes(field)),
  )
  if (typeof copy.water !== 'object' || copy.water === null) return copy
  const { measuredOn: _measuredOn, ...water } = copy.water as Record<string, unknown>
  return { ...copy, water }
}
