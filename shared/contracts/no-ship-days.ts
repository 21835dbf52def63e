import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { dayText, line } from '@/shared/contracts/values'

export const shownNoShipDay = z.object({
  day: dayText,
  why: z.string(),
  source: z.enum(['federal', 'own']),
  /** Taken off: carriers work on this day. */
  isOff: z.boolean(),
})
export type ShownNoShipDay = z.output<typeof shownNoShipDay>

const reply = z.object({ days: z.array(shownNoShipDay) })

export const listNoShipDays = endpoint({
  method: 'GET',
  path: '/moderation/no-ship-days',
  auth: 'moderator',
  summary: 'Days from today on without carriers, and those taken off the list',
  reply,
})

export const keepNoShipDay = endpoint({
  method: 'POST',
  path: '/moderation/no-ship-days',
  auth: 'moderator',
  idempotent: true,
  summary: 'Put a day on the list, or take one off it',
  body: z.object({ day: dayText, why: line(80).min(2, 'What is on that day?'), isOff: z.boolean() }).strict(),
  reply,
})
