import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { mayListing } from '@/server/listings/listing-policy'
import { findListingById, saveDraftIf } from '@/server/listings/listing-store'
import { requireOwnListing } from '@/server/listings/require-own-listing'
import { Problem } from '@/shared/api/problem'
import type { ListingDraft } from '@/shared/contracts/listings'

export interface TypedDraft {
  draft: ListingDraft
  draftRevision: number
}

/** Keeps what was typed, perhaps not valid yet. A draft that was changed on another device is never overwritten. */
export async function saveDraft(
  caller: Caller,
  publicId: string,
  typed: TypedDraft,
): Promise<{ draftRevision: number; savedAt: string }> {
  const { listing } = await requireOwnListing(caller, publicId)
  mayListing('edit', { ...listing, everSubmitted: true })
  const at = now()
  if (!(await saveDraftIf(listing.id, { ...typed, at }))) {
    const newer = await findListingById(listing.id)
    throw new Problem('version-stale', 'This listing was changed on another device or tab. Load it again.', {
      facts: { draftRevision: newer?.draftRevision ?? 0 },
    })
  }
  return { draftRevision: typed.draftRevision + 1, savedAt: at.toISOString() }
}
