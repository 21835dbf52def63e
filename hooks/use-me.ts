import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { Me } from '@/shared/contracts/members'

const meQuery = queryOptions({
  queryKey: ['me'],
  staleTime: STALE.minutes,
  queryFn: ({ signal }): Promise<Me | null> => call('readMe', { signal }),
})

/** Who is signed in: `undefined` while asking, `null` for a visitor. */
export function useMe() {
  const query = useQuery(meQuery)
  return { me: query.data, isPending: query.isPending, error: query.error, refetch: query.refetch }
}

export function useChangeMe() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (change: BodyOf<Endpoints['changeMe']>) => call('changeMe', { body: change }),
    onSuccess: (me) => client.setQueryData(['me'], me),
  })
}
