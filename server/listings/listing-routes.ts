import { Router } from 'express'

import { on } from '@/server/http/on'
import { adjustStock } from '@/server/listings/adjust-stock'
import { beginListing } from '@/server/listings/begin-listing'
import { changeSelling } from '@/server/listings/change-selling'
import { cutHarvest } from '@/server/listings/cut-harvest'
import { discardDraft } from '@/server/listings/discard-draft'
import { listOwnListings } from '@/server/listings/list-own-listings'
import { readListing } from '@/server/listings/read-listing'
import { readOwnListing } from '@/server/listings/read-own-listing'
import { saveDraft } from '@/server/listings/save-draft'
import { submitListing } from '@/server/listings/submit-listing'
import { listSellerListings } from '@/server/search/list-seller-listings'
import * as calls from '@/shared/contracts/listings'
import { listSellerListings as listSellerListingsCall } from '@/shared/contracts/search'

export function listingRoutes(): Router {
  const router = Router()
  on(
    router,
    calls.readListing,
  )(async ({ caller, params, query }) => readListing(caller, params.listingId, query.near))
  on(router, calls.listOwnListings)(async ({ caller, query }) => listOwnListings(caller, query))
  // After the seller's own list: `mine` is no seller's name.
  on(router, listSellerListingsCall)(async ({ params, query }) => listSellerListings(params.sellerId, query))
  on(router, calls.beginListing)(async ({ caller, body }) => beginListing(caller, body.copyOf))
  on(router, calls.readOwnListing)(async ({ caller, params }) => readOwnListing(caller, params.listingId))
  on(router, calls.saveDraft)(async ({ caller, params, body }) => saveDraft(caller, params.listingId, body))
  on(
    router,
    calls.submitListing,
  )(async ({ caller, params, body }) => submitListing(caller, params.listingId, body.draftRevision))
  on(
    router,
    calls.changeSelling,
  )(async ({ caller, params, body }) => changeSelling(caller, params.listingId, body.selling))
  on(
    router,
    calls.discardDraft,
  )(async ({ caller, params }) => {
    await discardDraft(caller, params.listingId)
    return undefined
  })
  on(
    router,
    calls.adjustStock,
  )(async ({ caller, params, body, key }) =>
    adjustStock(caller, params.listingId, { ...body, commandId: key }),
  )
  on(
    router,
    calls.cutHarvest,
  )(async ({ caller, params, body, key }) =>
    cutHarvest(caller, params.listingId, { ...body, commandId: key }),
  )
  return router
}
