import { Router } from 'express'

import { on } from '@/server/http/on'
import { searchLimit } from '@/server/search/search-limit'
import { readSeason } from '@/server/trips/read-season'
import { wayHome } from '@/server/trips/way-home'
import * as calls from '@/shared/contracts/trips'

export function tripRoutes(): Router {
  const router = Router()
  const limit = searchLimit()
  for (const { path } of [calls.readWayHome, calls.readSeason]) router.get(path, limit)
  on(router, calls.readWayHome)(async ({ params, query }) => wayHome({ ...params, ...query }))
  on(router, calls.readSeason)(async ({ query }) => readSeason(query))
  return router
}
