import { keepPreviousData, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

/** How far the drive home is, and the usual air of that day at both ends. */
export function useWayHome(listingId: string, near: string, day: string) {
  return useQuery({
    queryKey: ['way-home', listingId, near, day],
    staleTime: STALE.day,
    placeholderData: keepPreviousData,
    queryFn: ({ signal }) => call('readWayHome', { params: { listingId }, query: { near, day }, signal }),
  })
}
