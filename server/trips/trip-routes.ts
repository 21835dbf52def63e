import { Router } from 'express'

import { on } from '@/server/http/on'
import { searchLimit } from '@/server/search/search-limit'
import { wayHome } from '@/server/trips/way-home'
import { readWayHome } from '@/shared/contracts/trips'

export function tripRoutes(): Router {
  const router = Router()
  router.get(readWayHome.path, searchLimit())
  on(router, readWayHome)(async ({ params, query }) => wayHome({ ...params, ...query }))
  return router
}
