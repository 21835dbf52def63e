import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'

const airDay = z.object({ minC: z.number().min(-60).max(60), maxC: z.number().min(-60).max(60) })
const designWeather = z.object({ cold: airDay, hot: airDay })
const cm = z.number().min(5).max(300)

const leg = z.union([
  z.strictObject({ hours: z.number().positive().max(96), airC: z.number().min(-50).max(60) }),
  z.strictObject({
    hours: z.number().positive().max(96),
    exposure: z.enum(['outdoor', 'depot', 'van', 'cabin', 'parked-car']),
    end: z.enum(['origin', 'destination']),
  }),
])

export const boxSize = z.object({
  id: z.string().max(40),
  box: z.object({
    lengthCm: cm,
    widthCm: cm,
    heightCm: cm,
    wallMm: z.number().min(1).max(200),
    conductivityWPerMK: z.number().min(0.01).max(1),
  }),
  priceCents: z.int().min(1).max(100_000),
})

export const bagSize = z.object({
  id: z.string().max(40),
  waterL: z.number().min(0.1).max(50),
  oxygenL: z.number().min(0.1).max(150),
  priceCents: z.int().min(1).max(100_000),
})

/** What a packing plan is computed from; masses g, lengths mm, temperatures °C, volumes L. */
export const packingTask = z.object({
  /** Species id of the species facts. */
  species: z.string().max(60),
  count: z.int().min(1).max(100_000),
  massG: z.number().min(0.001).max(5000),
  stage: z.enum(['eggs', 'yolk-sac-fry', 'swim-up-fry', 'fingerling']).default('fingerling'),
  shortestMm: z.number().min(1).max(2000).nullable().default(null),
  longestMm: z.number().min(1).max(2000).nullable().default(null),
  fastedHours: z.number().min(0).max(500).nullable().default(null),
  startC: z.number().min(0).max(40),
  alkalinityMeqPerL: z.number().min(0.05).max(10).default(2),
  pH: z.number().min(5).max(10).default(8),
  legs: z.array(leg).min(1).max(50),
  /** Hour of the day at packing. */
  departHour: z.number().min(0).max(24).default(12),
  /** Cold and hot days at both ends; needed where a leg names an end instead of its air. */
  weather: z.object({ origin: designWeather, destination: designWeather }).nullable().default(null),
  /** A parcel that stands in a depot. */
  standsStill: z.boolean().default(true),
  /** Boxes and bags at hand; the usual ones when absent. */
  boxSizes: z.array(boxSize).min(1).max(12).optional(),
  bagSizes: z.array(bagSize).min(1).max(6).optional(),
})

/** The cheapest packing that is safe, as a printable page. 409 `trip-unsafe` with the reasons where there is none. */
export const makePackingSheet = endpoint({
  method: 'POST',
  path: '/packing-sheet',
  auth: 'public',
  summary: 'Packing sheet of a trip as PDF',
  body: packingTask,
  reply: z.instanceof(Uint8Array),
  replyMedia: 'application/pdf',
})
