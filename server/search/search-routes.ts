import { Router } from 'express'

import { on } from '@/server/http/on'
import { countFacets } from '@/server/search/count-facets'
import { searchLimit } from '@/server/search/search-limit'
import { searchPage } from '@/server/search/search-page'
import { showPins } from '@/server/search/show-pins'
import * as calls from '@/shared/contracts/search'

export function searchRoutes(): Router {
  const router = Router()
  const limit = searchLimit()
  for (const { path } of [calls.searchListings, calls.countFacets, calls.findPins]) router.get(path, limit)
  on(router, calls.searchListings)(async ({ query }) => searchPage(query))
  on(router, calls.countFacets)(async ({ query }) => countFacets(query))
  on(router, calls.findPins)(async ({ query }) => showPins(query))
  return router
}
