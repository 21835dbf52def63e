import { QueryClient } from '@tanstack/react-query'

import { Problem } from '@/shared/api/problem'
import { STALE } from '@/hooks/stale'

/** The app's one cache. An answer of the server is not asked again; a lost connection is, three times. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      staleTime: STALE.halfMinute,
      retry: (tries, error) => !(error instanceof Problem && error.status < 500) && tries < 3,
      refetchOnWindowFocus: true,
    },
    // Without a connection an act fails with a sentence at once, instead of waiting unseen for the network.
    mutations: { retry: false, networkMode: 'always' },
  },
})
