import { Router } from 'express'

import { on } from '@/server/http/on'
import { findPlaces } from '@/server/places/find-places'
import { findPlaces as findPlacesCall } from '@/shared/contracts/places'

export function placeRoutes(): Router {
  const router = Router()
  on(router, findPlacesCall)(async ({ query }) => ({ items: await findPlaces(query.q) }))
  return router
}
