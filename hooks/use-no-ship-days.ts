import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { newRequestKey } from '@/hooks/request-key'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

export type NoShipDayChange = BodyOf<Endpoints['keepNoShipDay']>

const noShipDaysQuery = queryOptions({
  queryKey: ['moderation', 'no-ship-days'],
  staleTime: STALE.minutes,
  queryFn: ({ signal }) => call('listNoShipDays', { signal }),
})

export function useNoShipDays() {
  return useQuery(noShipDaysQuery)
}

/** Puts a day on the list, or takes one off it; the answer is the whole list. */
export function useKeepNoShipDay() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (body: NoShipDayChange) => call('keepNoShipDay', { body, key: newRequestKey() }),
    onSuccess: (kept) => {
      client.setQueryData(noShipDaysQuery.queryKey, kept)
      return client.invalidateQueries({ queryKey: ['ship-days'] })
    },
  })
}
