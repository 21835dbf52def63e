import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { limitCalls } from '@/server/http/call-limit'
import type { Caller } from '@/server/http/caller'
import { checkSubmission } from '@/server/listings/check-submission'
import { keepSubmission } from '@/server/listings/keep-submission'
import { mayListing } from '@/server/listings/listing-policy'
import { readDraft } from '@/server/listings/read-draft'
import { readOwnListing } from '@/server/listings/read-own-listing'
import { requireOwnListing } from '@/server/listings/require-own-listing'
import { findVersion } from '@/server/listings/version-store'
import { Problem } from '@/shared/api/problem'
import type { OwnListing } from '@/shared/contracts/listings'

/**
 * Publishes the draft as a new version: checked whole, then live at once, or waiting for a moderator; what an edit
 * does is decided in shared/domain/listings/material-edit. Submitting the same again changes nothing.
 */
export async function submitListing(
  caller: Caller,
  publicId: string,
  draftRevision: number,
): Promise<OwnListing> {
  const { seller, listing } = await requireOwnListing(caller, publicId)
  mayListing('submit', { ...listing, everSubmitted: true })
  if (listing.draftRevision !== draftRevision) {
    throw new Problem('version-stale', 'The draft has changed since this page was loaded. Load it again.', {
      facts: { draftRevision: listing.draftRevision },
    })
  }
  await limitCalls({ name: 'submit-listing', windowS: 3600, most: 60 }, caller.memberId)
  const typed = readDraft(listing.draft)
  const onSale =
    listing.liveVersion === null ? null : ((await findVersion(listing.id, listing.liveVersion))?.body ?? null)
  // Once a batch is on sale its count is in the ledger, and the form's figure is only what it began with.
  const body = onSale ? { ...typed, countOnHand: onSale.countOnHand } : typed
  const at = now()
  const checked = await checkSubmission({ body, onSale, listing, seller, at })
  await inTransaction((tx) => keepSubmission({ ...checked, body, onSale, listing, seller, at }, tx))
  return readOwnListing(caller, publicId)
}
