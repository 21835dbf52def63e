import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { OwnSeller } from '@/shared/contracts/sellers'

export type FarmBody = BodyOf<Endpoints['openFarm']>

const key = ['sellers', 'mine'] as const
const ownFarmQuery = queryOptions({
  queryKey: key,
  staleTime: STALE.halfMinute,
  queryFn: ({ signal }) => call('readOwnFarm', { signal }),
})

/** The member's own farm; asked only once they are a seller. */
export function useOwnFarm(isSeller: boolean) {
  return useQuery({ ...ownFarmQuery, enabled: isSeller })
}

/** Opens the farm, or changes it where there is one already. */
export function useSaveFarm(isOpen: boolean) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ farm, key }: { farm: FarmBody; key: string }): Promise<OwnSeller> =>
      isOpen ? call('changeFarm', { body: farm }) : call('openFarm', { body: farm, key }),
    onSuccess: (saved) => {
      client.setQueryData(key, saved)
      return client.invalidateQueries({ queryKey: ['me'] })
    },
  })
}

/** The address of the payment processor's own page for this seller; it is good for a few minutes. */
export function useStartPayouts() {
  return useMutation({ mutationFn: (key: string) => call('startPayouts', { key }) })
}
