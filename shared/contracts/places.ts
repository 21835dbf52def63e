import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { cellIdText, stateCode, zipCode, zoneName } from '@/shared/contracts/values'

/** A place as the public may know it: a name and a location cell, never a point. */
export const place = z.object({
  label: z.string(),
  cell: cellIdText,
  state: stateCode,
  zip: zipCode.optional(),
  zone: zoneName,
  lat: z.number(),
  lng: z.number(),
})
export type Place = z.output<typeof place>

/** Type-ahead: a ZIP, a three-digit prefix, "city, ST", "city ST", a city, or a location cell id. */
export const findPlaces = endpoint({
  method: 'GET',
  path: '/places',
  auth: 'public',
  summary: 'Find a place by ZIP, city or location cell',
  query: z.object({ q: z.string().trim().min(1).max(80) }),
  reply: z.object({ items: z.array(place) }),
})
