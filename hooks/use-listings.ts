import { keepPreviousData, queryOptions, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

const listingQuery = (listingId: string, near: string | undefined) =>
  queryOptions({
    queryKey: ['listings', 'page', listingId, near ?? ''],
    staleTime: STALE.live,
    queryFn: ({ signal }) => call('readListing', { params: { listingId }, query: { near }, signal }),
  })

/** One listing, with distance and legal status for the place given. */
export function useListing(listingId: string, near: string | undefined, isReady: boolean) {
  return useQuery({ ...listingQuery(listingId, near), enabled: isReady, placeholderData: keepPreviousData })
}
