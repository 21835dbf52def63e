import { infiniteQueryOptions, useInfiniteQuery, useMutation, useQueryClient } from '@tanstack/react-query'

import { call } from '@/hooks/api'
import { newRequestKey } from '@/hooks/request-key'
import { STALE } from '@/hooks/stale'
import type { BodyOf } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'

const ratingsQuery = (sellerId: string) =>
  infiniteQueryOptions({
    queryKey: ['ratings', sellerId],
    staleTime: STALE.minutes,
    initialPageParam: '',
    queryFn: ({ pageParam, signal }) =>
      call('listRatings', {
        params: { sellerId },
        query: pageParam ? { cursor: pageParam } : {},
        signal,
      }),
    getNextPageParam: (page) => page.nextCursor,
  })

export function useSellerRatings(sellerId: string) {
  return useInfiniteQuery(ratingsQuery(sellerId))
}

/** What a rating changes: the order page, the seller's record and list, and the order of search. */
function useForget() {
  const client = useQueryClient()
  return () =>
    Promise.all(
      [['orders'], ['ratings'], ['sellers'], ['listings']].map((queryKey) =>
        client.invalidateQueries({ queryKey }),
      ),
    )
}

/** Gives a rating, or changes the one that stands. */
export function useRateOrder(orderId: string, isChange: boolean) {
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints['rateOrder']>) =>
      isChange
        ? call('changeRating', { params: { orderId }, body })
        : call('rateOrder', { params: { orderId }, body, key: newRequestKey() }),
    onSuccess: useForget(),
  })
}

export function useReplyToRating(orderId: string) {
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints['replyToRating']>) =>
      call('replyToRating', { params: { orderId }, body, key: newRequestKey() }),
    onSuccess: useForget(),
  })
}

export function useAnswerSurvival(orderId: string) {
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints['answerSurvival']>) =>
      call('answerSurvival', { params: { orderId }, body, key: newRequestKey() }),
    onSuccess: useForget(),
  })
}

export function useHideRatingWords(ratingId: string) {
  return useMutation({
    mutationFn: (body: BodyOf<Endpoints['hideRatingWords']>) =>
      call('hideRatingWords', { params: { ratingId }, body, key: newRequestKey() }),
    onSuccess: useForget(),
  })
}
