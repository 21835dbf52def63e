import { z } from 'zod'

import {
  cents,
  dayText,
  instantText,
  line,
  publicIdText,
  stateCode,
  zipCode,
} from '@/shared/contracts/values'
import { packingClassIds } from '@/shared/domain/season/season-lane'
import { isLabelText } from '@/shared/domain/shipping/label-text'

const READABLE = 'Carriers and labels need plain letters: write it with A to Z, accents are fine.'
const labelLine = (most: number) => line(most).normalize('NFC').refine(isLabelText, READABLE)

/** Where a box goes: the seller reads it from the agreed day on, and it is printed on the label. */
export const shipAddress = z
  .object({
    name: labelLine(80).min(2, 'Whose name is on the door?'),
    street: labelLine(120).min(3, 'Street and number.'),
    city: labelLine(64).min(2, 'Which town?'),
    state: stateCode,
    zip: zipCode,
    phone: line(24).regex(/^[0-9+() .-]{7,24}$/, 'A phone number that the carrier can ring.'),
  })
  .strict()
export type ShipAddress = z.output<typeof shipAddress>

/** A paper that travels with the animals, as the seller names it. */
export const routePaper = z
  .object({
    /** The words of the legal gate that asked for it. */
    kind: line(160).min(2, 'Which paper?'),
    number: line(60).min(1, 'Its number.'),
    issuer: line(80).min(2, 'Who issued it?'),
    issuedOn: dayText,
    expiresOn: dayText,
  })
  .strict()
  .refine((paper) => paper.expiresOn >= paper.issuedOn, {
    path: ['expiresOn'],
    message: 'It cannot expire before it was issued.',
  })
export type RoutePaper = z.output<typeof routePaper>

export const checkVerdict = z.enum(['safe', 'unsafe', 'unknown'])
export const weatherBasis = z.enum(['forecast', 'long-term'])

const airDay = z.object({ minC: z.number(), maxC: z.number() })
const designWeather = z.object({ cold: airDay, hot: airDay })

/** How each box is packed; the same for all boxes of an order. */
export const boxPacking = z.object({
  boxes: z.int(),
  animalsPerBox: z.int(),
  /** Absent in bedding. */
  bagsPerBox: z.int().optional(),
  animalsPerBag: z.int().optional(),
  waterLPerBag: z.number().optional(),
  oxygenLPerBag: z.number().optional(),
  beddingKg: z.number().optional(),
  packs: z.enum(['none', 'heat', 'cold']),
  packCount: z.int(),
  /** Hours printed on the heat pack. */
  packHours: z.int().optional(),
  startC: z.number(),
  coldestC: z.number().optional(),
  warmestC: z.number().optional(),
  hours: z.number(),
})
export type BoxPacking = z.output<typeof boxPacking>

/** One check of a route as it was made: enough to make it again and to explain it. */
export const routeCheckFacts = z.object({
  basis: weatherBasis,
  weather: z.object({ origin: designWeather, destination: designWeather }).optional(),
  packing: boxPacking.optional(),
  reasons: z.array(
    z.object({
      code: z.string(),
      verdict: z.string(),
      value: z.number().nullable(),
      limit: z.number().nullable(),
    }),
  ),
  /** What is to be told when it is not safe: the worst air of the way. */
  worst: z.object({ side: z.enum(['cold', 'hot']), place: z.string(), airC: z.number() }).optional(),
})
export type RouteCheckFacts = z.output<typeof routeCheckFacts>

export const shownRouteCheck = z.object({
  kind: z.enum(['reservation', 'evening', 'morning', 'seller']),
  at: instantText,
  shipDay: dayText,
  verdict: checkVerdict,
  basis: weatherBasis,
  packing: boxPacking.optional(),
  /** Sentences, the strictest first; empty when safe. */
  reasons: z.array(z.string()),
  worst: routeCheckFacts.shape.worst,
  /** Good for the dispatch until then; absent unless safe and of the agreed day. */
  goodUntil: instantText.optional(),
})
export type ShownRouteCheck = z.output<typeof shownRouteCheck>

/** Data of the paper that travels with the animals (fields: rules of the trade; states that ask for one name these). */
export const movementFacts = z.object({
  number: z.string(),
  at: instantText,
  seller: z.object({ name: z.string(), licences: z.string(), address: z.string() }),
  buyer: z.object({ name: z.string(), address: z.string() }),
  permits: z.array(routePaper),
  commonName: z.string(),
  scientificName: z.string(),
  size: z.string(),
  count: z.int(),
  boxes: z.int(),
  batch: z.string(),
  carrier: z.string(),
  tracking: z.string(),
  notForRelease: z.string(),
})
export type MovementFacts = z.output<typeof movementFacts>

export const shownShipment = z.object({
  shipDay: dayText,
  arriveDay: dayText,
  promisedAt: instantText,
  toZone: z.string(),
  packing: z.enum(packingClassIds),
  boxes: z.int(),
  deliverTo: z.enum(['door', 'counter']),
  carrier: z.string(),
  /** The buyer's own, and the seller's to read from the agreed day on. */
  address: shipAddress.optional(),
  papers: z.array(routePaper),
  papersNeeded: z.array(z.string()),
  tracking: z.string().optional(),
  dispatchedAt: instantText.optional(),
  arrivedAt: instantText.optional(),
  /** Of a late box: how many the buyer found alive. */
  aliveCount: z.int().optional(),
  check: shownRouteCheck.optional(),
  movement: movementFacts.optional(),
})
export type ShownShipment = z.output<typeof shownShipment>

/** A hold that waits for the buyer, or the last one that was answered. */
export const shownHold = z.object({
  number: z.int(),
  startedBy: z.enum(['system', 'seller']),
  startedAt: instantText,
  why: z.string(),
  proposed: z
    .object({
      startsAt: instantText,
      endsAt: instantText,
      shipDay: dayText.optional(),
      windowId: publicIdText.optional(),
    })
    .optional(),
  silenceMoves: z.boolean(),
  answer: z.enum(['agreed', 'silence', 'declined', 'no-consent', 'cancelled']).optional(),
})
export type ShownHold = z.output<typeof shownHold>

/** A day on which a box could leave, and how the way looks on it. */
export const shipDayOffer = z.object({
  shipDay: dayText,
  arriveDay: dayText,
  verdict: checkVerdict,
  basis: weatherBasis,
  packing: boxPacking.optional(),
  reasons: z.array(z.string()),
  worst: routeCheckFacts.shape.worst,
})
export type ShipDayOffer = z.output<typeof shipDayOffer>

export const shipDayOffers = z.object({
  boxes: z.int(),
  boxCents: cents,
  freightCents: cents,
  days: z.array(shipDayOffer),
})
export type ShipDayOffers = z.output<typeof shipDayOffers>
