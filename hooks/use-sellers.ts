import { queryOptions, useQuery } from '@tanstack/react-query'

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

/** A seller's public page. */
export function useSeller(sellerId: string) {
  return useQuery(sellerQuery(sellerId))
}
