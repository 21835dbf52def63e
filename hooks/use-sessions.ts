import { queryOptions, useMutation, useQuery, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

const sessionsQuery = queryOptions({
  queryKey: ['me', 'sessions'],
  staleTime: STALE.live,
  queryFn: ({ signal }) => call('listSessions', { signal }),
})

/** Where the member is signed in. */
export function useSessions() {
  return useQuery(sessionsQuery)
}

/** Ends one sign-in by its id, or every other one without it. */
export function useEndSession() {
  const client = useQueryClient()
  return useMutation({
    mutationFn: (sessionId: string | undefined) =>
      sessionId === undefined ? call('endOtherSessions', {}) : call('endSession', { params: { sessionId } }),
    // Also after a refusal: what is listed may have ended meanwhile.
    onSettled: () => client.invalidateQueries({ queryKey: sessionsQuery.queryKey }),
  })
}
