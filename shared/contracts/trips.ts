import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { seasonVerdict } from '@/shared/contracts/shipping'
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

export const readSeason = endpoint({
  method: 'GET',
  path: '/season',
  auth: 'public',
  summary: 'In which weeks of the year an animal usually survives being shipped from one place to another',
  query: z.object({
    from: z.string().max(24),
    to: z.string().max(24),
    species: z.string().max(60),
    packing: z.string().max(40),
  }),
  reply: z.object({
    /** The year and ISO week of the product's clock. */
    year: z.int(),
    week: z.int(),
    /** 52 of them, the first ISO week first. */
    weeks: z.array(
      z.object({
        verdict: seasonVerdict,
        /** Packs in each box for a cold and for a warm day; absent unless safe. */
        forCold: z.string().optional(),
        forHeat: z.string().optional(),
      }),
    ),
    /** From this week on; absent: none. */
    nextSafeWeek: z.int().optional(),
  }),
})
