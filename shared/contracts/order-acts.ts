import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { orderParams, shownOrder } from '@/shared/contracts/orders'
import { line, publicIdText } from '@/shared/contracts/values'

const act = <P extends `/${string}`>(path: P, summary: string) =>
  endpoint({
    method: 'POST',
    path,
    auth: 'member',
    idempotent: true,
    summary,
    params: orderParams,
    reply: shownOrder,
  })

export const payDeposit = act(
  '/orders/:orderId/deposit-payment',
  'Open the payment page again while the hold runs',
)
export const leaveReservation = act('/orders/:orderId/departure', 'Give up an unpaid hold')
export const withdrawRequest = act(
  '/orders/:orderId/withdrawal',
  'Take a request back before the seller answers',
)
export const acceptOrder = act('/orders/:orderId/acceptance', 'The seller accepts: the deposit is taken')
export const markReady = act('/orders/:orderId/readiness', 'The seller has the animals ready for the window')
export const payBalance = act('/orders/:orderId/balance-payment', 'Open the payment page for the rest')
export const confirmGood = act(
  '/orders/:orderId/confirmation',
  'The buyer says all is good: the money is released',
)

export const declineOrder = endpoint({
  method: 'POST',
  path: '/orders/:orderId/refusal',
  auth: 'member',
  idempotent: true,
  summary: 'The seller declines, with a reason',
  params: orderParams,
  body: z
    .object({
      reason: z.enum(['short-count', 'not-ready', 'sick', 'cannot-make-slot', 'other']),
      note: line(300).optional(),
    })
    .strict(),
  reply: shownOrder,
})

export const handOver = endpoint({
  method: 'POST',
  path: '/orders/:orderId/hand-over',
  auth: 'member',
  idempotent: true,
  summary: 'The seller enters the code the buyer gives, and the count both saw',
  params: orderParams,
  body: z
    .object({
      code: z.string().regex(/^\d{6}$/, 'Six digits, from the buyer’s screen.'),
      count: z.int({ message: 'The count you both saw.' }).min(1, 'The count you both saw.').max(1_000_000),
    })
    .strict(),
  reply: shownOrder,
})

export const sellerCancelReasons = ['die-off', 'failed-spawn', 'short-count', 'other'] as const

/** Either party ends the order: a buyer for any reason, a seller with one. */
export const cancelOrder = endpoint({
  method: 'POST',
  path: '/orders/:orderId/cancellation',
  auth: 'member',
  idempotent: true,
  summary: 'End the order; what goes back is shown before',
  params: orderParams,
  body: z.object({ reason: z.enum(sellerCancelReasons).optional(), note: line(300).optional() }).strict(),
  reply: shownOrder,
})

export const chooseSlot = endpoint({
  method: 'POST',
  path: '/orders/:orderId/slot',
  auth: 'member',
  idempotent: true,
  summary: 'Agree on a pickup window, or move to another one',
  params: orderParams,
  body: z.object({ windowId: publicIdText }).strict(),
  reply: shownOrder,
})

export const reportNoShow = endpoint({
  method: 'POST',
  path: '/orders/:orderId/no-show',
  auth: 'member',
  idempotent: true,
  summary: 'Say that the other party did not come; they have a day to object',
  params: orderParams,
  body: z.object({ note: line(300).optional() }).strict(),
  reply: shownOrder,
})

export const contestNoShow = endpoint({
  method: 'POST',
  path: '/orders/:orderId/contest',
  auth: 'member',
  idempotent: true,
  summary: 'Object to a reported no-show: a moderator looks at it',
  params: orderParams,
  body: z.object({ note: line(300).min(10, 'Say in a sentence what happened.') }).strict(),
  reply: shownOrder,
})

export const stopOrder = endpoint({
  method: 'POST',
  path: '/moderation/orders/:orderId/stop',
  auth: 'moderator',
  idempotent: true,
  summary: 'Stop an order: everything goes back to the buyer',
  params: orderParams,
  body: z
    .object({
      cause: z.enum(['prohibited-species', 'recall', 'fraud', 'seller-gone']),
      animals: z.enum(['free', 'frozen']),
      note: line(300).min(10, 'Say in a sentence why; both parties read it.'),
    })
    .strict(),
  reply: shownOrder,
})

export const decideOrder = endpoint({
  method: 'POST',
  path: '/moderation/orders/:orderId/decision',
  auth: 'moderator',
  idempotent: true,
  summary: 'Decide an unclear hand-over or a late box',
  params: orderParams,
  body: z
    .object({
      /** Of a hand-over nobody agrees on the first three, of a late box the last two. */
      outcome: z.enum(['handed-over', 'buyer-absent', 'seller-absent', 'arrived', 'lost']),
      /** Of a late box that came: how many were alive. */
      aliveCount: z.int({ message: 'How many were alive?' }).min(0).max(1_000_000).optional(),
      note: line(300).min(10, 'Say in a sentence why; both parties read it.'),
    })
    .strict(),
  reply: shownOrder,
})
