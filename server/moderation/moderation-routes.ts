import { Router } from 'express'

import { on } from '@/server/http/on'
import { decideReview } from '@/server/moderation/decide-review'
import { listReviews } from '@/server/moderation/list-reviews'
import { readReview } from '@/server/moderation/read-review'
import * as calls from '@/shared/contracts/moderation'

export function moderationRoutes(): Router {
  const router = Router()
  on(router, calls.listReviews)(async ({ caller, query }) => listReviews(caller, query))
  on(router, calls.readReview)(async ({ caller, params }) => readReview(caller, Number(params.versionId)))
  on(
    router,
    calls.decideReview,
  )(async ({ caller, params, body }) => decideReview(caller, Number(params.versionId), body))
  return router
}
