import {
  infiniteQueryOptions,
  queryOptions,
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
  type QueryClient,
} from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { OwnListing } from '@/shared/contracts/listings'

export const ownListingKey = (listingId: string) => ['listings', 'mine', listingId] as const

const ownListingsQuery = infiniteQueryOptions({
  queryKey: ['listings', 'mine'] as const,
  staleTime: STALE.live,
  initialPageParam: undefined as string | undefined,
  queryFn: ({ pageParam, signal }) => call('listOwnListings', { query: { cursor: pageParam }, signal }),
  getNextPageParam: (page) => page.nextCursor,
})

const ownListingQuery = (listingId: string) =>
  queryOptions({
    queryKey: ownListingKey(listingId),
    staleTime: STALE.live,
    queryFn: ({ signal }) => call('readOwnListing', { params: { listingId }, signal }),
  })

export function useOwnListings(isSeller: boolean) {
  return useInfiniteQuery({ ...ownListingsQuery, enabled: isSeller })
}

/** Asked anew whenever its page opens: the draft may have grown on another device. */
export function useOwnListing(listingId: string) {
  return useQuery({ ...ownListingQuery(listingId), refetchOnMount: 'always' })
}

/** Reads a listing again at this moment, past whatever is remembered. */
export function useReadOwnListing(listingId: string) {
  const client = useQueryClient()
  return () => client.fetchQuery({ ...ownListingQuery(listingId), staleTime: 0 })
}

function remember(client: QueryClient, own: OwnListing) {
  client.setQueryData(ownListingKey(own.listingId), own)
  return client.invalidateQueries({ queryKey: ownListingsQuery.queryKey, exact: true })
}

export function useBeginListing() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ copyOf, key }: { copyOf?: string; key: string }) =>
      call('beginListing', { body: { copyOf }, key }),
    onSuccess: (own) => remember(client, own),
  })
}

export function useSubmitListing(listingId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ draftRevision, key }: { draftRevision: number; key: string }) =>
      call('submitListing', { params: { listingId }, body: { draftRevision }, key }),
    onSuccess: (own) => remember(client, own),
  })
}

export function useChangeSelling(listingId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (selling: 'paused' | 'live') =>
      call('changeSelling', { params: { listingId }, body: { selling } }),
    onSuccess: (own) => remember(client, own),
  })
}

export type StockChange = BodyOf<Endpoints['adjustStock']>

export function useAdjustStock(listingId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ change, key }: { change: StockChange; key: string }) =>
      call('adjustStock', { params: { listingId }, body: change, key }),
    onSuccess: (own) => remember(client, own),
  })
}

export function useDiscardDraft(listingId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: () => call('discardDraft', { params: { listingId } }),
    onSuccess: () => {
      client.removeQueries({ queryKey: ownListingKey(listingId) })
      return client.invalidateQueries({ queryKey: ownListingsQuery.queryKey, exact: true })
    },
  })
}
