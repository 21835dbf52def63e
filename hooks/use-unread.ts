import { queryOptions, useQuery } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import { useMe } from '@/hooks/use-me'

const POLL_MS = 60_000

const unreadQuery = queryOptions({
  queryKey: ['notices', 'unread'],
  staleTime: STALE.halfMinute,
  queryFn: ({ signal }) => call('countUnreadNotices', { signal }),
  refetchInterval: POLL_MS,
})

/** How many wait to be read, up to a hundred; null for a visitor and while nobody has counted yet. */
export function useUnread(): number | null {
  const { me } = useMe()
  const { data } = useQuery({ ...unreadQuery, enabled: Boolean(me) })
  return me ? (data?.unread ?? null) : null
}
