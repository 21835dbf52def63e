import { infiniteQueryOptions, queryOptions, useInfiniteQuery, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import type { ReplyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

export type ShownSeller = ReplyOf<Endpoints['readSeller']>

const sellerQuery = (sellerId: string) =>
  queryOptions({
    queryKey: ['sellers', sellerId],
    staleTime: STALE.minutes,
    queryFn: ({ signal }) => call('readSeller', { params: { sellerId }, signal }),
  })

const onSaleQuery = (sellerId: string, near: string | undefined) =>
  infiniteQueryOptions({
    queryKey: ['listings', 'of-seller', sellerId, near ?? ''],
    staleTime: STALE.halfMinute,
    initialPageParam: undefined as string | undefined,
    queryFn: ({ pageParam, signal }) =>
      call('listSellerListings', { params: { sellerId }, query: { near, cursor: pageParam }, signal }),
    getNextPageParam: (page) => page.nextCursor,
  })

/** A seller's public page. */
export function useSeller(sellerId: string) {
  return useQuery(sellerQuery(sellerId))
}

/** What a seller has on sale now, told for the reader's place when one is known. */
export function useOnSale(sellerId: string, near: string | undefined, isReady: boolean) {
  return useInfiniteQuery({ ...onSaleQuery(sellerId, near), enabled: isReady })
}
