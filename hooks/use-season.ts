import { keepPreviousData, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

interface Asked {
  from: string
  to: string
  species: string
  packing: string
}

/** The 52 weeks of shipping one kind of animal between two areas; asked once both are said. */
export function useSeason({ from, to, species, packing }: Asked) {
  return useQuery({
    queryKey: ['season', from, to, species, packing],
    enabled: from !== '' && to !== '',
    staleTime: STALE.minutes,
    placeholderData: keepPreviousData,
    queryFn: ({ signal }) => call('readSeason', { query: { from, to, species, packing }, signal }),
  })
}
