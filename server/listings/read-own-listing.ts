import type { Caller } from '@/server/http/caller'
import { presentOwnListings } from '@/server/listings/present-own-listing'
import { requireOwnListing } from '@/server/listings/require-own-listing'
import { Problem } from '@/shared/api/problem'
import type { OwnListing } from '@/shared/contracts/listings'

export async function readOwnListing(caller: Caller, publicId: string): Promise<OwnListing> {
  const { listing } = await requireOwnListing(caller, publicId)
  const [shown] = await presentOwnListings([listing])
  if (!shown) throw new Problem('not-found')
  return shown
}
