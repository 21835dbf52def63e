import { infiniteQueryOptions, useInfiniteQuery, useMutation, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { STALE } from '@/hooks/stale'

const noticesQuery = infiniteQueryOptions({
  queryKey: ['notices', 'list'],
  staleTime: STALE.live,
  initialPageParam: '',
  queryFn: ({ pageParam, signal }) =>
    call('listNotices', { query: pageParam ? { cursor: pageParam } : {}, signal }),
  getNextPageParam: (page) => page.nextCursor,
})

export function useNotices() {
  return useInfiniteQuery(noticesQuery)
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
