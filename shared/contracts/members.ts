import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import {
  cellIdText,
  knownZone,
  line,
  publicIdText,
  stateCode,
  themeChoice,
  unitSystem,
  wallTime,
} from '@/shared/contracts/values'

export const roles = ['member', 'seller', 'moderator', 'admin'] as const

/** Hours on the wall clock of the member's own zone in which no reminder is mailed; they may go over midnight. */
export const quietHours = z
  .object({ from: wallTime, until: wallTime, zone: knownZone })
  .refine(({ from, until }) => from !== until, {
    message: 'The end must differ from the beginning.',
    path: ['until'],
  })

export const me = z.object({
  name: z.string(),
  email: z.string(),
  emailVerified: z.boolean(),
  roles: z.array(z.enum(roles)),
  secondFactor: z.object({ enabled: z.boolean(), required: z.boolean() }),
  place: z.object({ label: z.string(), cell: cellIdText, state: stateCode }).optional(),
  units: unitSystem,
  theme: themeChoice,
  mail: z.object({ reminders: z.boolean(), quiet: quietHours.optional() }),
  sellerId: publicIdText.optional(),
  waiting: z.object({ orders: z.int(), reviews: z.int() }),
})
export type Me = z.output<typeof me>

export const readMe = endpoint({
  method: 'GET',
  path: '/me',
  // A visitor is a fact, not a refusal: every page asks this first.
  auth: 'public',
  summary: 'Who is signed in, and what waits for them; null for a visitor',
  reply: me.nullable(),
})

export const changeMe = endpoint({
  method: 'PATCH',
  path: '/me',
  auth: 'member',
  summary: 'Change name, place, units, theme or mail wishes',
  body: z
    .object({
      name: line(80).min(1, 'Please give a name.').optional(),
      place: cellIdText.optional(),
      placeLabel: line(120).optional(),
      units: unitSystem.optional(),
      theme: themeChoice.optional(),
      reminders: z.boolean().optional(),
      /** null: no quiet hours. */
      quiet: quietHours.nullable().optional(),
    })
    .strict(),
  reply: me,
})
