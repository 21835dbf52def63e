import { keepPreviousData, queryOptions, useQuery, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import { useSettled } from '@/hooks/use-settled'

const fewestCharacters = 2

const placesQuery = (q: string) =>
  queryOptions({
    queryKey: ['places', q.trim().toLowerCase()],
    staleTime: STALE.day,
    queryFn: ({ signal }) => call('findPlaces', { query: { q: q.trim() }, signal }),
  })

/** Places that fit what is being typed; asked once the typing rests. */
export function usePlaces(typed: string) {
  const settled = useSettled(typed, 180)
  const isAsked = settled.trim().length >= fewestCharacters
  const query = useQuery({ ...placesQuery(settled), enabled: isAsked, placeholderData: keepPreviousData })
  return {
    places: isAsked ? (query.data?.items ?? []) : [],
    isLoading: query.isFetching || settled !== typed,
    error: query.error,
  }
}

/** The first place a text or a cell id stands for, asked at once. null: no such place. */
export function useFirstPlace() {
  const client = useQueryClient()
  return async (text: string) => (await client.fetchQuery(placesQuery(text))).items[0] ?? null
}
