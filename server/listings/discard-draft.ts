import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { mayListing } from '@/server/listings/listing-policy'
import { deleteListing, lockListing } from '@/server/listings/listing-store'
import { requireOwnListing } from '@/server/listings/require-own-listing'
import { findLatestVersion } from '@/server/listings/version-store'
import { Problem } from '@/shared/api/problem'

export async function discardDraft(caller: Caller, publicId: string): Promise<void> {
  const { listing } = await requireOwnListing(caller, publicId)
  await inTransaction(async (tx) => {
    const row = await lockListing(listing.id, tx)
    if (!row) throw new Problem('not-found')
    mayListing('discard', { ...row, everSubmitted: (await findLatestVersion(row.id, tx)) !== null })
    await deleteListing(row.id, tx)
  })
}
