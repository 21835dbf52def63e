import { Router } from 'express'

import { on } from '@/server/http/on'
import { packingLimit } from '@/server/packing/packing-limit'
import { searchLimit } from '@/server/search/search-limit'
import { checkRoute } from '@/server/shipping/check-route'
import { chooseShipDay } from '@/server/shipping/choose-ship-day'
import { dispatchOrder } from '@/server/shipping/dispatch-order'
import { keepNoShipDay } from '@/server/shipping/keep-no-ship-day'
import { keepRoutePapers } from '@/server/shipping/keep-route-papers'
import { listNoShipDays } from '@/server/shipping/list-no-ship-days'
import { listOrderShipDays } from '@/server/shipping/list-order-ship-days'
import { printOrderPacking } from '@/server/shipping/print-order-packing'
import { readMovement } from '@/server/shipping/read-movement'
import { readShipDays } from '@/server/shipping/read-ship-days'
import { reportArrival } from '@/server/shipping/report-arrival'
import { reportLateArrival } from '@/server/shipping/report-late-arrival'
import { reportLateBox } from '@/server/shipping/report-late-box'
import { lookLimit } from '@/server/weather/look-limit'
import * as days from '@/shared/contracts/no-ship-days'
import * as acts from '@/shared/contracts/ship-acts'

export function shipRoutes(): Router {
  const router = Router()
  // Each answer judges up to nine trips: it costs what a search costs.
  const limit = searchLimit()
  for (const { path } of [acts.readShipDays, acts.listOrderShipDays]) router.get(path, limit)
  const looks = lookLimit()
  for (const { path } of [acts.chooseShipDay, acts.checkRoute]) router.post(path, looks)
  router.get(acts.printOrderPacking.path, packingLimit())
  on(router, acts.readShipDays)(async ({ params, query }) => readShipDays({ ...params, ...query }))
  on(router, acts.listOrderShipDays)(async ({ caller, params }) => listOrderShipDays(caller, params.orderId))
  on(
    router,
    acts.chooseShipDay,
  )(async ({ caller, params, body, key }) =>
    chooseShipDay(caller, params.orderId, { ...body, commandId: key }),
  )
  on(router, acts.checkRoute)(async ({ caller, params }) => checkRoute(caller, params.orderId))
  on(
    router,
    acts.keepRoutePapers,
  )(async ({ caller, params, body }) => keepRoutePapers(caller, params.orderId, body.papers))
  on(
    router,
    acts.dispatchOrder,
  )(async ({ caller, params, body, key }) =>
    dispatchOrder(caller, params.orderId, { ...body, commandId: key }),
  )
  on(
    router,
    acts.reportArrival,
  )(async ({ caller, params, key }) => reportArrival(caller, params.orderId, key))
  on(
    router,
    acts.reportLateBox,
  )(async ({ caller, params, key }) => reportLateBox(caller, params.orderId, key))
  on(
    router,
    acts.reportLateArrival,
  )(async ({ caller, params, body, key }) =>
    reportLateArrival(caller, params.orderId, { ...body, commandId: key }),
  )
  on(router, acts.readMovement)(async ({ caller, params }) => readMovement(caller, params.orderId))
  on(router, acts.printOrderPacking)(async ({ caller, params }) => printOrderPacking(caller, params.orderId))
  on(router, days.listNoShipDays)(async () => listNoShipDays())
  on(router, days.keepNoShipDay)(async ({ caller, body }) => keepNoShipDay(caller, body))
  return router
}
