import { Router } from 'express'

import { on } from '@/server/http/on'
import { decideReview } from '@/server/moderation/decide-review'
import { dismissReports } from '@/server/moderation/dismiss-reports'
import { listReportedListings } from '@/server/moderation/list-reported-listings'
import { listReviews } from '@/server/moderation/list-reviews'
import { readReview } from '@/server/moderation/read-review'
import { reportListing } from '@/server/moderation/report-listing'
import { takeDownListing } from '@/server/moderation/take-down-listing'
import * as reports from '@/shared/contracts/listing-reports'
import * as calls from '@/shared/contracts/moderation'

export function moderationRoutes(): Router {
  const router = Router()
  on(router, calls.listReviews)(async ({ caller, query }) => listReviews(caller, query))
  on(router, calls.readReview)(async ({ caller, params }) => readReview(caller, Number(params.versionId)))
  on(
    router,
    calls.decideReview,
  )(async ({ caller, params, body }) => decideReview(caller, Number(params.versionId), body))
  on(
    router,
    reports.reportListing,
  )(async ({ caller, params, body }) => reportListing(caller, params.listingId, body))
  on(router, reports.listReportedListings)(async ({ caller, query }) => listReportedListings(caller, query))
  on(
    router,
    reports.dismissReports,
  )(async ({ caller, params, body }) => dismissReports(caller, params.listingId, body))
  on(
    router,
    reports.takeDownListing,
  )(async ({ caller, params, body }) => takeDownListing(caller, params.listingId, body))
  return router
}
