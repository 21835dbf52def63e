import {
  infiniteQueryOptions,
  keepPreviousData,
  queryOptions,
  useInfiniteQuery,
  useQuery,
} from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import type { QueryOf, ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { SearchAsked } from '@/shared/contracts/search'

export type FacetsAsked = QueryOf<Endpoints['countFacets']>

export type FoundPage = ReplyOf<Endpoints['searchListings']>

const foundQuery = (asked: SearchAsked) =>
  infiniteQueryOptions({
    queryKey: ['listings', 'found', asked],
    staleTime: STALE.halfMinute,
    initialPageParam: undefined as string | undefined,
    getNextPageParam: (page: FoundPage) => page.nextCursor,
    queryFn: ({ pageParam, signal }) =>
      call('searchListings', { query: { ...asked, cursor: pageParam }, signal }),
  })

const facetsQuery = (asked: FacetsAsked) =>
  queryOptions({
    queryKey: ['listings', 'facets', asked],
    staleTime: STALE.halfMinute,
    queryFn: ({ signal }) => call('countFacets', { query: asked, signal }),
  })

/** Listings page by page; the pages before stay on screen while a changed search is under way. */
export function useSearch(asked: SearchAsked, isReady: boolean) {
  return useInfiniteQuery({ ...foundQuery(asked), enabled: isReady, placeholderData: keepPreviousData })
}

/** Counts beside categories and species, asked after the listings. */
export function useFacets(asked: FacetsAsked, isReady: boolean) {
  return useQuery({ ...facetsQuery(asked), enabled: isReady, placeholderData: keepPreviousData })
}
