import { queryOptions, useMutation, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

const ownFarmQuery = queryOptions({
  queryKey: ['sellers', 'mine'],
  staleTime: STALE.halfMinute,
  queryFn: ({ signal }) => call('readOwnFarm', { signal }),
})

/** The member's own farm; asked only once they are a seller. */
export function useOwnFarm(isSeller: boolean) {
  return useQuery({ ...ownFarmQuery, enabled: isSeller })
}

/** The address of the payment processor's own page for this seller; it is good for a few minutes. */
export function useStartPayouts() {
  return useMutation({ mutationFn: (key: string) => call('startPayouts', { key }) })
}
