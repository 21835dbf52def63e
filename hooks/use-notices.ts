import {
  infiniteQueryOptions,
  queryOptions,
  useInfiniteQuery,
  useMutation,
  useQuery,
  useQueryClient,
} from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'
import { useMe } from '@/hooks/use-me'

const POLL_MS = 60_000

const noticesQuery = infiniteQueryOptions({
  queryKey: ['notices', 'list'],
  staleTime: STALE.live,
  initialPageParam: '',
  queryFn: ({ pageParam, signal }) =>
    call('listNotices', { query: pageParam ? { cursor: pageParam } : {}, signal }),
  getNextPageParam: (page) => page.nextCursor,
})

const unreadQuery = queryOptions({
  queryKey: ['notices', 'unread'],
  staleTime: STALE.halfMinute,
  queryFn: ({ signal }) => call('countUnreadNotices', { signal }),
  refetchInterval: POLL_MS,
})

export function useNotices() {
  return useInfiniteQuery(noticesQuery)
}

/** How many wait to be read, up to a hundred; null for a visitor and while nobody has counted yet. */
export function useUnread(): number | null {
  const { me } = useMe()
  const { data } = useQuery({ ...unreadQuery, enabled: Boolean(me) })
  return me ? (data?.unread ?? null) : null
}

function useKeepUnread() {
  const client = useQueryClient()
  return (counted: { unread: number }) => {
    client.setQueryData(['notices', 'unread'], counted)
    void client.invalidateQueries({ queryKey: ['notices', 'list'] })
  }
}

export function useReadNotice() {
  const keep = useKeepUnread()
  return useMutation({
    mutationFn: (noticeId: string) => call('readNotice', { params: { noticeId } }),
    onSuccess: keep,
  })
}

export function useReadAllNotices() {
  const keep = useKeepUnread()
  return useMutation({ mutationFn: () => call('readAllNotices', {}), onSuccess: keep })
}
