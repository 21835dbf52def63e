import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { orderParams, shownOrder } from '@/shared/contracts/orders'
import {
  checkVerdict,
  movementFacts,
  routePaper,
  shipDayOffers,
  weatherBasis,
} from '@/shared/contracts/shipments'
import { dayText, instantText, line, publicIdText } from '@/shared/contracts/values'

const count = z.coerce.number().int().min(1).max(1_000_000)

export const readShipDays = endpoint({
  method: 'GET',
  path: '/listings/:listingId/ship-days',
  auth: 'public',
  summary:
    'The coming days on which a box could leave for a place, what it costs, and whether the animals survive',
  params: z.object({ listingId: publicIdText }),
  query: z.object({ near: z.string().max(24), quantity: count }),
  reply: shipDayOffers,
})

export const listOrderShipDays = endpoint({
  method: 'GET',
  path: '/orders/:orderId/ship-days',
  auth: 'member',
  summary: 'The days an order could be moved to, for its two parties',
  params: orderParams,
  reply: shipDayOffers,
})

export const chooseShipDay = endpoint({
  method: 'POST',
  path: '/orders/:orderId/ship-day',
  auth: 'member',
  idempotent: true,
  summary: 'Agree on a ship day, or move to another one',
  params: orderParams,
  body: z.object({ shipDay: dayText }).strict(),
  reply: shownOrder,
})

export const checkRoute = endpoint({
  method: 'POST',
  path: '/orders/:orderId/route-check',
  auth: 'member',
  idempotent: true,
  summary: 'The seller has the way looked at anew; the answer is kept with the order',
  params: orderParams,
  reply: shownOrder,
})

export const keepRoutePapers = endpoint({
  method: 'POST',
  path: '/orders/:orderId/route-papers',
  auth: 'member',
  idempotent: true,
  summary: 'The seller names the papers that travel with the animals',
  params: orderParams,
  body: z.object({ papers: z.array(routePaper).max(10) }).strict(),
  reply: shownOrder,
})

/** What whoever packs confirms, each by its own tick. */
export const packingTicks = [
  'strong-carton',
  'contents-on-address-side',
  'no-free-postal-box',
  'carrier-told',
  'packed-as-planned',
] as const
export type PackingTick = (typeof packingTicks)[number]

export const dispatchOrder = endpoint({
  method: 'POST',
  path: '/orders/:orderId/dispatch',
  auth: 'member',
  idempotent: true,
  summary: 'The seller hands the box to the carrier; refused with every reason and the nearest lawful day',
  params: orderParams,
  body: z
    .object({
      tracking: line(60).min(4, 'The tracking number from the receipt.'),
      ticks: z.array(z.enum(packingTicks)).max(10),
    })
    .strict(),
  reply: shownOrder,
})

export const reportArrival = endpoint({
  method: 'POST',
  path: '/orders/:orderId/arrival',
  auth: 'member',
  idempotent: true,
  summary: 'The buyer has the box: the claim window begins',
  params: orderParams,
  reply: shownOrder,
})

export const reportLateBox = endpoint({
  method: 'POST',
  path: '/orders/:orderId/late-box',
  auth: 'member',
  idempotent: true,
  summary: 'The promised time is over and the box has not come',
  params: orderParams,
  reply: shownOrder,
})

export const reportLateArrival = endpoint({
  method: 'POST',
  path: '/orders/:orderId/late-arrival',
  auth: 'member',
  idempotent: true,
  summary: 'A late box came after all: all alive ends the claim, fewer are for a moderator',
  params: orderParams,
  body: z.object({ aliveCount: z.int({ message: 'How many are alive?' }).min(0).max(1_000_000) }).strict(),
  reply: shownOrder,
})

export const readMovement = endpoint({
  method: 'GET',
  path: '/orders/:orderId/movement-document',
  auth: 'member',
  summary: 'Data of the paper that travels with the animals, for the two parties and for staff',
  params: orderParams,
  reply: movementFacts,
})

export const printOrderPacking = endpoint({
  method: 'GET',
  path: '/orders/:orderId/packing-sheet',
  auth: 'member',
  summary: 'Packing sheet and a label for each box of an order, as PDF, for its seller',
  params: orderParams,
  reply: z.instanceof(Uint8Array),
  replyMedia: 'application/pdf',
})

export const holdForWeather = endpoint({
  method: 'POST',
  path: '/orders/:orderId/weather-hold',
  auth: 'member',
  idempotent: true,
  summary: 'The seller holds an order for weather and proposes another day; without one it is open-ended',
  params: orderParams,
  body: z
    .object({
      why: line(200).min(5, 'Say in a few words what the weather does; the buyer reads it.'),
      shipDay: dayText.optional(),
      windowId: publicIdText.optional(),
    })
    .strict(),
  reply: shownOrder,
})

export const agreeNewDay = endpoint({
  method: 'POST',
  path: '/orders/:orderId/new-day',
  auth: 'member',
  idempotent: true,
  summary: 'The buyer agrees to the proposed day, or takes another one that is offered',
  params: orderParams,
  body: z.object({ shipDay: dayText.optional(), windowId: publicIdText.optional() }).strict(),
  reply: shownOrder,
})

export const declineNewDay = endpoint({
  method: 'POST',
  path: '/orders/:orderId/new-day-refusal',
  auth: 'member',
  idempotent: true,
  summary: 'The buyer ends a held order: everything goes back',
  params: orderParams,
  reply: shownOrder,
})

export const routeRow = z.object({
  orderId: publicIdText,
  state: z.enum(['scheduled', 'weather_hold', 'ready']),
  title: z.string(),
  quantity: z.int(),
  buyerName: z.string(),
  to: z.string(),
  shipDay: dayText,
  arriveDay: dayText,
  boxes: z.int(),
  balancePaid: z.boolean(),
  verdict: checkVerdict.optional(),
  basis: weatherBasis.optional(),
  checkedAt: instantText.optional(),
  /** In a sentence: the worst of the way, or how the boxes are packed. */
  words: z.string().optional(),
})
export type RouteRow = z.output<typeof routeRow>

export const listRoutes = endpoint({
  method: 'GET',
  path: '/routes',
  auth: 'seller',
  summary: 'Every order the seller is to ship, by day, with its last check',
  query: z.object({ limit: z.coerce.number().int().min(1).max(200).default(200) }),
  reply: z.object({ rows: z.array(routeRow), asOf: instantText }),
})

export const checkRoutes = endpoint({
  method: 'POST',
  path: '/routes/checks',
  auth: 'seller',
  idempotent: true,
  summary: 'Look at all ways of one ship day anew and hold those that are not safe',
  body: z.object({ shipDay: dayText, hold: z.boolean() }).strict(),
  reply: z.object({ rows: z.array(routeRow), held: z.int(), asOf: instantText }),
})
