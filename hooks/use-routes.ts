import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { newRequestKey } from '@/hooks/request-key'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

const routesQuery = queryOptions({
  queryKey: ['routes'],
  staleTime: STALE.live,
  queryFn: ({ signal }) => call('listRoutes', { query: {}, signal }),
})

/** Every order the seller is to ship, with its last check. */
export function useRoutes(isReady: boolean) {
  return useQuery({ ...routesQuery, enabled: isReady })
}

/** All ways of one ship day looked at anew: the list and the orders that were held have changed. */
export function useCheckRoutes() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints['checkRoutes']>) =>
      call('checkRoutes', { body, key: newRequestKey() }),
    onSuccess: () =>
      Promise.all(
        [['routes'], ['orders'], ['me'], ['notices']].map((queryKey) =>
          client.invalidateQueries({ queryKey }),
        ),
      ),
  })
}
