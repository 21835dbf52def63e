import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { dayText, publicIdText } from '@/shared/contracts/values'

/** Usual air of one day at one place, °C, with its day-to-day spread. */
const usualAir = z.object({ minC: z.number(), maxC: z.number(), sdMinC: z.number(), sdMaxC: z.number() })
export type UsualAir = z.output<typeof usualAir>

const wayHome = z.object({
  day: dayText,
  distanceKm: z.number(),
  /** null: no weather station near enough. */
  origin: usualAir.nullable(),
  destination: usualAir.nullable(),
})
export type WayHome = z.output<typeof wayHome>

export const readWayHome = endpoint({
  method: 'GET',
  path: '/listings/:listingId/way-home',
  auth: 'public',
  summary: 'How far the drive home is and what the air is usually like at both ends on that day',
  params: z.object({ listingId: publicIdText }),
  query: z.object({ near: z.string().max(24), day: dayText }),
  reply: wayHome,
})
