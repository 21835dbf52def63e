import { queryOptions, type QueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import type { OwnListing } from '@/shared/contracts/listings'

export const ownListingsKey = ['listings', 'mine'] as const
export const ownListingKey = (listingId: string) => [...ownListingsKey, listingId] as const

export const ownListingQuery = (listingId: string) =>
  queryOptions({
    queryKey: ownListingKey(listingId),
    staleTime: STALE.live,
    queryFn: ({ signal }) => call('readOwnListing', { params: { listingId }, signal }),
  })

/** Keeps what the server answered about one listing; the list is asked again. */
export function rememberOwnListing(client: QueryClient, own: OwnListing) {
  client.setQueryData(ownListingKey(own.listingId), own)
  return client.invalidateQueries({ queryKey: ownListingsKey, exact: true })
}
