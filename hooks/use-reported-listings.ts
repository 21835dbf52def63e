import { infiniteQueryOptions, useInfiniteQuery, useMutation, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { newRequestKey } from '@/hooks/request-key'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

export type Dismissal = BodyOf<Endpoints['dismissReports']>
export type TakeDown = BodyOf<Endpoints['takeDownListing']>

const reportedQuery = infiniteQueryOptions({
  queryKey: ['moderation', 'reported'],
  staleTime: STALE.live,
  initialPageParam: undefined as string | undefined,
  queryFn: ({ pageParam, signal }) =>
    call('listReportedListings', { query: { cursor: pageParam, limit: 50 }, signal }),
  getNextPageParam: (page) => page.nextCursor,
})

export function useReportedListings() {
  return useInfiniteQuery(reportedQuery)
}

/** What a decision changes: both lists of the desk, and the listing wherever it is shown. */
function useForget() {
  const client = useQueryClient()
  return () =>
    Promise.all([['moderation'], ['listings']].map((queryKey) => client.invalidateQueries({ queryKey })))
}

export function useDismissReports(listingId: string) {
  return useMutation({
    mutationFn: (body: Dismissal) =>
      call('dismissReports', { params: { listingId }, body, key: newRequestKey() }),
    onSuccess: useForget(),
  })
}

export function useTakeDownListing(listingId: string) {
  return useMutation({
    mutationFn: (body: TakeDown) =>
      call('takeDownListing', { params: { listingId }, body, key: newRequestKey() }),
    onSuccess: useForget(),
  })
}
