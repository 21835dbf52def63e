import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { shownRating, shownSurvival } from '@/shared/contracts/ratings'
import { gateVerdict } from '@/shared/contracts/rules'
import { shipAddress, shownHold, shownShipment } from '@/shared/contracts/shipments'
import { cents, dayText, instantText, pageOf, publicIdText } from '@/shared/contracts/values'
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
  'choose-ship-day',
  'check-route',
  'name-papers',
  'dispatch',
  'report-arrival',
  'report-late-box',
  'report-late-arrival',
  'hold-for-weather',
  'agree-new-day',
  'decline-new-day',
  'rate',
  'change-rating',
  'reply-to-rating',
  'answer-survival',
] as const

export const orderParams = z.object({ orderId: publicIdText })

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
  /** Of an order that is shipped. */
  shipment: shownShipment.optional(),
  /** The last time weather stopped its day. */
  hold: shownHold.optional(),
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
      /** Instead of a pickup: the box leaves on that day. `near` is then the ZIP code of the address. */
      ship: z
        .object({ shipDay: dayText, deliverTo: z.enum(['door', 'counter']), address: shipAddress })
        .strict()
        .optional(),
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
