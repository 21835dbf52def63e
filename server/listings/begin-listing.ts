import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { limitCalls } from '@/server/http/call-limit'
import type { Caller } from '@/server/http/caller'
import { copyDraft } from '@/server/listings/copy-draft'
import { insertListing } from '@/server/listings/listing-store'
import { readOwnListing } from '@/server/listings/read-own-listing'
import { requireOwnListing } from '@/server/listings/require-own-listing'
import { newPublicId } from '@/server/new-public-id'
import { requireSeller } from '@/server/sellers/require-seller'
import type { OwnListing } from '@/shared/contracts/listings'

export async function beginListing(caller: Caller, copyOf: string | undefined): Promise<OwnListing> {
  const seller = await requireSeller(caller)
  const draft = copyOf ? copyDraft((await requireOwnListing(caller, copyOf)).listing.draft) : {}
  await limitCalls({ name: 'begin-listing', windowS: 3600, most: 60 }, caller.memberId)
  const publicId = newPublicId()
  const at = now()
  await inTransaction((tx) =>
    insertListing(
      {
        publicId,
        sellerId: seller.id,
        category: 'fish',
        state: 'draft',
        draft,
        createdAt: at,
        updatedAt: at,
      },
      tx,
    ),
  )
  return readOwnListing(caller, publicId)
}
