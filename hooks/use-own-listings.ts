import {
  infiniteQueryOptions,
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
} from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { ownListingQuery, ownListingsKey, rememberOwnListing } from '@/hooks/own-listing-query'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ListingDraft, OwnListing } from '@/shared/contracts/listings'

const ownListingsQuery = infiniteQueryOptions({
  queryKey: ownListingsKey,
  staleTime: STALE.live,
  initialPageParam: undefined as string | undefined,
  queryFn: ({ pageParam, signal }) => call('listOwnListings', { query: { cursor: pageParam }, signal }),
  getNextPageParam: (page) => page.nextCursor,
})

export function useOwnListings(isSeller: boolean) {
  return useInfiniteQuery({ ...ownListingsQuery, enabled: isSeller })
}

/** Asked anew whenever its page opens: the draft may have grown on another device. */
export function useOwnListing(listingId: string) {
  return useQuery({ ...ownListingQuery(listingId), refetchOnMount: 'always' })
}

export function useBeginListing() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ copyOf, key }: { copyOf?: string; key: string }) =>
      call('beginListing', { body: { copyOf }, key }),
    onSuccess: (own) => rememberOwnListing(client, own),
  })
}

/** Puts a first draft into a listing that was just begun. */
export function useFillDraft() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: async ({ own, draft }: { own: OwnListing; draft: ListingDraft }): Promise<OwnListing> => {
      const { listingId, draftRevision } = own
      const saved = await call('saveDraft', { params: { listingId }, body: { draft, draftRevision } })
      return { ...own, draft, draftRevision: saved.draftRevision }
    },
    onSuccess: (own) => rememberOwnListing(client, own),
  })
}

export function useChangeSelling(listingId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (selling: 'paused' | 'live') =>
      call('changeSelling', { params: { listingId }, body: { selling } }),
    onSuccess: (own) => rememberOwnListing(client, own),
  })
}

export type StockChange = BodyOf<Endpoints['adjustStock']>

export function useAdjustStock(listingId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ change, key }: { change: StockChange; key: string }) =>
      call('adjustStock', { params: { listingId }, body: change, key }),
    onSuccess: (own) => rememberOwnListing(client, own),
  })
}
