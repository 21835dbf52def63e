import { Router } from 'express'

import { on } from '@/server/http/on'
import { agreeNewDay, declineNewDay } from '@/server/weather/answer-hold'
import { checkRoutes } from '@/server/weather/check-routes'
import { holdForWeather } from '@/server/weather/hold-for-weather'
import { listRoutes } from '@/server/weather/list-routes'
import { bulkLookLimit, lookLimit } from '@/server/weather/look-limit'
import * as calls from '@/shared/contracts/ship-acts'

export function weatherRoutes(): Router {
  const router = Router()
  const looks = lookLimit()
  for (const { path } of [calls.holdForWeather, calls.agreeNewDay]) router.post(path, looks)
  router.post(calls.checkRoutes.path, bulkLookLimit())
  on(
    router,
    calls.holdForWeather,
  )(({ caller, params, body, key }) => holdForWeather(caller, params.orderId, { ...body, commandId: key }))
  on(
    router,
    calls.agreeNewDay,
  )(({ caller, params, body, key }) => agreeNewDay(caller, params.orderId, { ...body, commandId: key }))
  on(router, calls.declineNewDay)(({ caller, params, key }) => declineNewDay(caller, params.orderId, key))
  on(router, calls.listRoutes)(({ caller, query }) => listRoutes(caller, query.limit))
  on(router, calls.checkRoutes)(({ caller, body }) => checkRoutes(caller, body))
  return router
}
