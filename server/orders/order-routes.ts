import { Router } from 'express'

import { on } from '@/server/http/on'
import { acceptOrder } from '@/server/orders/accept-order'
import { cancelOrder } from '@/server/orders/cancel-order'
import { chooseSlot } from '@/server/orders/choose-slot'
import { confirmGood } from '@/server/orders/confirm-good'
import { contestNoShow } from '@/server/orders/contest-no-show'
import { decideOrder } from '@/server/orders/decide-order'
import { declineOrder } from '@/server/orders/decline-order'
import { handOver } from '@/server/orders/hand-over'
import { leaveReservation } from '@/server/orders/leave-reservation'
import { listOrders } from '@/server/orders/list-orders'
import { markReady } from '@/server/orders/mark-ready'
import { payBalance } from '@/server/orders/pay-balance'
import { payDeposit } from '@/server/orders/pay-deposit'
import { reportNoShow } from '@/server/orders/report-no-show'
import { showOrder } from '@/server/orders/show-order'
import { reserveBatch } from '@/server/orders/reserve-batch'
import { stopOrder } from '@/server/orders/stop-order'
import { withdrawRequest } from '@/server/orders/withdraw-request'
import * as acts from '@/shared/contracts/order-acts'
import * as orders from '@/shared/contracts/orders'

export function orderRoutes(): Router {
  const router = Router()
  on(
    router,
    orders.reserveBatch,
  )(({ caller, params, body, key }) => reserveBatch(caller, params.listingId, { ...body, commandId: key }))
  on(router, orders.listOrders)(({ caller, query }) => listOrders(caller, query))
  on(router, orders.readOrder)(({ caller, params }) => showOrder(caller, params.orderId))
  on(router, acts.payDeposit)(({ caller, params }) => payDeposit(caller, params.orderId))
  on(
    router,
    acts.leaveReservation,
  )(({ caller, params, key }) => leaveReservation(caller, params.orderId, key))
  on(router, acts.withdrawRequest)(({ caller, params, key }) => withdrawRequest(caller, params.orderId, key))
  on(router, acts.acceptOrder)(({ caller, params, key }) => acceptOrder(caller, params.orderId, key))
  on(
    router,
    acts.declineOrder,
  )(({ caller, params, body, key }) => declineOrder(caller, params.orderId, { ...body, commandId: key }))
  on(router, acts.markReady)(({ caller, params, key }) => markReady(caller, params.orderId, key))
  on(router, acts.payBalance)(({ caller, params }) => payBalance(caller, params.orderId))
  on(
    router,
    acts.handOver,
  )(({ caller, params, body, key }) => handOver(caller, params.orderId, { ...body, commandId: key }))
  on(router, acts.confirmGood)(({ caller, params, key }) => confirmGood(caller, params.orderId, key))
  on(
    router,
    acts.cancelOrder,
  )(({ caller, params, body, key }) => cancelOrder(caller, params.orderId, { ...body, commandId: key }))
  on(
    router,
    acts.chooseSlot,
  )(({ caller, params, body, key }) => chooseSlot(caller, params.orderId, { ...body, commandId: key }))
  on(
    router,
    acts.reportNoShow,
  )(({ caller, params, body, key }) => reportNoShow(caller, params.orderId, { ...body, commandId: key }))
  on(
    router,
    acts.contestNoShow,
  )(({ caller, params, body, key }) => contestNoShow(caller, params.orderId, { ...body, commandId: key }))
  on(
    router,
    acts.stopOrder,
  )(({ caller, params, body, key }) => stopOrder(caller, params.orderId, { ...body, commandId: key }))
  on(
    router,
    acts.decideOrder,
  )(({ caller, params, body, key }) => decideOrder(caller, params.orderId, { ...body, commandId: key }))
  return router
}
