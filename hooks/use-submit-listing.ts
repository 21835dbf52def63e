import { useMutation, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { ownListingKey, ownListingQuery, ownListingsKey, rememberOwnListing } from '@/hooks/own-listing-query'

// The acts of the batch form, apart from those of the Sell place: each loads with its own group.

/** Reads a listing again at this moment, past whatever is remembered. */
export function useReadOwnListing(listingId: string) {
  const client = useQueryClient()
  return () => client.fetchQuery({ ...ownListingQuery(listingId), staleTime: 0 })
}

export function useSubmitListing(listingId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ draftRevision, key }: { draftRevision: number; key: string }) =>
      call('submitListing', { params: { listingId }, body: { draftRevision }, key }),
    onSuccess: (own) => rememberOwnListing(client, own),
  })
}

export function useDiscardDraft(listingId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: () => call('discardDraft', { params: { listingId } }),
    onSuccess: () => {
      client.removeQueries({ queryKey: ownListingKey(listingId) })
      return client.invalidateQueries({ queryKey: ownListingsKey, exact: true })
    },
  })
}
