import { useMutation, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { OwnSeller } from '@/shared/contracts/sellers'

export type FarmBody = BodyOf<Endpoints['openFarm']>

/** Opens the farm, or changes it where there is one already. */
export function useSaveFarm(isOpen: boolean) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ farm, key }: { farm: FarmBody; key: string }): Promise<OwnSeller> =>
      isOpen ? call('changeFarm', { body: farm }) : call('openFarm', { body: farm, key }),
    onSuccess: (saved) => {
      client.setQueryData(['sellers', 'mine'], saved)
      return client.invalidateQueries({ queryKey: ['me'] })
    },
  })
}
