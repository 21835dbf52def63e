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
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

export type Decision = BodyOf<Endpoints['decideReview']>

const queueKey = ['moderation', 'queue'] as const
const reviewKey = (versionId: string) => ['moderation', 'review', versionId] as const

const queueQuery = infiniteQueryOptions({
  queryKey: queueKey,
  staleTime: STALE.live,
  initialPageParam: undefined as string | undefined,
  queryFn: ({ pageParam, signal }) =>
    call('listReviews', { query: { cursor: pageParam, limit: 50 }, signal }),
  getNextPageParam: (page) => page.nextCursor,
})

const reviewQuery = (versionId: string) =>
  queryOptions({
    queryKey: reviewKey(versionId),
    staleTime: STALE.live,
    queryFn: ({ signal }) => call('readReview', { params: { versionId }, signal }),
  })

export function useReviewQueue() {
  return useInfiniteQuery(queueQuery)
}

export function useReview(versionId: string) {
  return useQuery(reviewQuery(versionId))
}

export function useDecideReview(versionId: string) {
  const client = useQueryClient()
  return useMutation({
    mutationFn: ({ decision, key }: { decision: Decision; key: string }) =>
      call('decideReview', { params: { versionId }, body: decision, key }),
    onSuccess: (decided) => {
      client.setQueryData(reviewKey(versionId), decided)
      void client.invalidateQueries({ queryKey: ['me'] })
      return client.invalidateQueries({ queryKey: queueKey })
    },
  })
}
