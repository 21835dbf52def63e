import { Router } from 'express'

import { on } from '@/server/http/on'
import { makePackingSheet } from '@/server/packing/make-packing-sheet'
import { packingLimit } from '@/server/packing/packing-limit'
import { makePackingSheet as call } from '@/shared/contracts/packing'

export function packingRoutes(): Router {
  const router = Router()
  router.post(call.path, packingLimit())
  on(router, call)(async ({ body }) => makePackingSheet(body))
  return router
}
