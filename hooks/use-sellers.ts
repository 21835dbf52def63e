import { queryOptions, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

const sellerQuery = (sellerId: string) =>
  queryOptions({
    queryKey: ['sellers', sellerId],
    staleTime: STALE.minutes,
    queryFn: ({ signal }) => call('readSeller', { params: { sellerId }, signal }),
  })

/** A seller's public page. */
export function useSeller(sellerId: string) {
  return useQuery(sellerQuery(sellerId))
}
