import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { shownRating, shownSurvival } from '@/shared/contracts/ratings'
import { gateVerdict } from '@/shared/contracts/rules'
import { cents, instantText, line, pageOf, publicIdText } from '@/shared/contracts/values'
import { cancelReasons, orderStates } from '@/shared/domain/orders/states.facts'

export const orderActs = [
  'pay-deposit',
  'leave',
  'withdraw',
  'accept',
  'decline',
  'mark-ready',
  'pay-balance',
  'hand-over',
  'confirm-good',
  'choose-slot',
  'cancel',
  'report-no-show',
  'contest',
  'stop',
  'decide',
  'rate',
  'change-rating',
  'reply-to-rating',
  'answer-survival',
] as const

const orderParams = z.object({ orderId: publicIdText })

export const orderMoney = z.object({
  goodsCents: cents,
  boxCents: cents,
  freightCents: cents,
  taxCents: cents,
  totalCents: cents,
  depositCents: cents,
  firstChargeCents: cents,
  balanceCents: cents,
  feeCents: cents,
  refundedCents: cents,
  /** Where the order's real cents stand now; the parts of the money strip. */
  strip: z.object({
    depositCents: cents,
    balanceCents: cents,
    heldCents: cents,
    releasedCents: cents,
    refundedCents: cents,
  }),
})

export const shownOrder = z.object({
  orderId: publicIdText,
  party: z.enum(['buyer', 'seller', 'staff']),
  state: z.enum(orderStates),
  reason: z.enum(cancelReasons).optional(),
  listingId: publicIdText,
  title: z.string(),
  photo: z.object({ photoId: z.string(), ground: z.string(), alt: z.string() }).optional(),
  quantity: z.int(),
  unitCents: cents,
  money: orderMoney,
  payMode: z.enum(['deposit', 'full']),
  balanceDue: z.enum(['at-handover', 'before']),
  balancePaid: z.boolean(),
  accepting: z.boolean(),
  needsAcceptance: z.boolean(),
  handOver: z.enum(['pickup', 'ship']),
  slot: z
    .object({ startsAt: instantText, endsAt: instantText, zone: z.string(), placeKind: z.string() })
    .optional(),
  otherParty: z.object({ name: z.string(), sellerId: publicIdText.optional() }),
  /** Only for the two parties, from `scheduled` on. */
  meeting: z
    .object({ street: z.string(), city: z.string(), state: z.string(), zip: z.string(), phone: z.string() })
    .optional(),
  /** The buyer's code: shown once nothing is left to pay. */
  handOverCode: z.string().optional(),
  countHandedOver: z.int().optional(),
  rating: shownRating.optional(),
  survival: shownSurvival.optional(),
  arrivalPromise: z.string(),
  clock: z.object({ at: instantText, edge: z.string() }).optional(),
  /** Until when the buyer may cancel and get everything back; absent where that is always so. */
  freeCancelUntil: instantText.optional(),
  noShow: z.object({ by: z.enum(['buyer', 'seller']), contestUntil: instantText }).optional(),
  events: z.array(
    z.object({ edge: z.string(), to: z.enum(orderStates), actor: z.string(), at: instantText }),
  ),
  gate: gateVerdict.optional(),
  payUrl: z.string().optional(),
  /** The server's time, so that a countdown does not trust the device's clock. */
  asOf: instantText,
  may: z.array(z.enum(orderActs)),
})
export type ShownOrder = z.output<typeof shownOrder>

export const reserveBatch = endpoint({
  method: 'POST',
  path: '/listings/:listingId/orders',
  auth: 'member',
  idempotent: true,
  status: 201,
  summary: 'Hold animals and a place in a pickup window for 15 minutes, and open the payment page',
  params: z.object({ listingId: publicIdText }),
  body: z
    .object({
      quantity: z.int({ message: 'How many?' }).min(1, 'How many?').max(1_000_000),
      windowId: publicIdText.optional(),
      payMode: z.enum(['deposit', 'full']).default('deposit'),
      near: z
        .string()
        .regex(/^(\d{5}|\d{2,3}\.\d{1,4}\.\d{1,4})$/, 'Where will the animals live? A ZIP code.'),
      ticked: z.array(z.string().max(80)).max(30).default([]),
      version: z.int().min(1),
    })
    .strict(),
  reply: shownOrder,
})

export const readOrder = endpoint({
  method: 'GET',
  path: '/orders/:orderId',
  auth: 'member',
  summary: 'One order, for its two parties and for staff',
  params: orderParams,
  reply: shownOrder,
})

export const orderRow = shownOrder
  .pick({
    orderId: true,
    party: true,
    state: true,
    reason: true,
    listingId: true,
    title: true,
    photo: true,
    quantity: true,
    slot: true,
    otherParty: true,
    clock: true,
    handOver: true,
    balanceDue: true,
    balancePaid: true,
    may: true,
  })
  .extend({ totalCents: cents, createdAt: instantText })
export type OrderRow = z.output<typeof orderRow>

export const listOrders = endpoint({
  method: 'GET',
  path: '/orders',
  auth: 'member',
  summary: "The member's orders as buyer or as seller, newest first",
  query: z.object({
    as: z.enum(['buyer', 'seller']).default('buyer'),
    show: z.enum(['open', 'all']).default('all'),
    listing: publicIdText.optional(),
    cursor: z.string().max(400).optional(),
    limit: z.coerce.number().int().min(1).max(50).default(20),
  }),
  reply: pageOf(orderRow),
})

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
  summary: 'Decide an unclear hand-over',
  params: orderParams,
  body: z
    .object({
      outcome: z.enum(['handed-over', 'buyer-absent', 'seller-absent']),
      note: line(300).min(10, 'Say in a sentence why; both parties read it.'),
    })
    .strict(),
  reply: shownOrder,
})
