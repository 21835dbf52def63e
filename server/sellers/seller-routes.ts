import { Router } from 'express'

import { on } from '@/server/http/on'
import { changeFarm } from '@/server/sellers/change-farm'
import { openFarm } from '@/server/sellers/open-farm'
import { readOwnFarm } from '@/server/sellers/read-own-farm'
import { readSeller } from '@/server/sellers/read-seller'
import { startPayouts } from '@/server/sellers/start-payouts'
import * as calls from '@/shared/contracts/sellers'

export function sellerRoutes(): Router {
  const router = Router()
  on(router, calls.openFarm)(async ({ caller, body }) => openFarm(caller, body))
  on(router, calls.readOwnFarm)(async ({ caller }) => readOwnFarm(caller))
  on(router, calls.changeFarm)(async ({ caller, body }) => changeFarm(caller, body))
  on(router, calls.startPayouts)(async ({ caller, key }) => startPayouts(caller, key))
  on(router, calls.readSeller)(async ({ params }) => readSeller(params.sellerId))
  return router
}
