import { Router } from 'express'

import { on } from '@/server/http/on'
import { answerSurvival } from '@/server/ratings/answer-survival'
import { hideRatingWords } from '@/server/ratings/hide-rating-words'
import { listRatings } from '@/server/ratings/list-ratings'
import { changeRating, rateOrder } from '@/server/ratings/rate-order'
import { replyToRating } from '@/server/ratings/reply-to-rating'
import * as calls from '@/shared/contracts/ratings'

export function ratingRoutes(): Router {
  const router = Router()
  on(router, calls.rateOrder)(({ caller, params, body }) => rateOrder(caller, params.orderId, body))
  on(router, calls.changeRating)(({ caller, params, body }) => changeRating(caller, params.orderId, body))
  on(
    router,
    calls.replyToRating,
  )(({ caller, params, body }) => replyToRating(caller, params.orderId, body.words))
  on(
    router,
    calls.answerSurvival,
  )(({ caller, params, body }) => answerSurvival(caller, params.orderId, body.alive))
  on(router, calls.listRatings)(({ params, query }) => listRatings(params.sellerId, query))
  on(
    router,
    calls.hideRatingWords,
  )(({ caller, params, body }) => hideRatingWords(caller, params.ratingId, body))
  return router
}
