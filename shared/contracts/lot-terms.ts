import { z } from 'zod'

import { dayText, line, photoId } from '@/shared/contracts/values'

/** A whole count with one saying for whatever is wrong with it. */
export const wholeCount = (least: number, saying: string, tooMany?: string) =>
  z.int({ message: saying }).min(least, saying).max(1_000_000, tooMany)

/** What is said where nothing was answered. A batch of fish leaves them out: its own form asks before the contract does. */
export interface LotSayings {
  day?: string
  time?: string
  manyBuyers?: string
  window?: string
  windows?: string
  manyWindows?: string
  accept?: string
  balanceDue?: string
  tier?: string
  tiers?: string
  tooMany?: string
}

/** From this count on, one unit costs this; `unitCents` says what is asked for one. */
export const tierOf = (unitCents: z.ZodType<number, number>, said: LotSayings) =>
  z.object({ fromCount: wholeCount(1, 'From how many?', said.tooMany), unitCents }, said.tier).strict()

const clockTime = /^\d{2}:\d{2}$/

/** A pickup window as the seller types it: a day and two times in the zone of the place. */
export const windowOf = (said: LotSayings) =>
  z
    .object(
      {
        day: z.iso.date(said.day),
        from: z.string(said.time).regex(clockTime, 'A time, like 09:00.'),
        until: z.string(said.time).regex(clockTime, 'A time, like 10:00.'),
        capacity: z
          .int({ message: 'How many buyers fit?' })
          .min(1, 'At least one buyer.')
          .max(500, said.manyBuyers),
      },
      said.window,
    )
    .strict()
export type TypedWindow = z.output<ReturnType<typeof windowOf>>

/** How many there are and what they cost. Steps and tiers count whole units. */
export const stockTerms = <Tier extends z.ZodType>(tier: Tier, said: LotSayings) => ({
  countOnHand: wholeCount(1, 'How many are there to sell?', said.tooMany),
  minOrder: wholeCount(1, 'The smallest order.', said.tooMany),
  orderStep: wholeCount(1, 'Sold in steps of how many?', said.tooMany),
  mostPerBuyer: wholeCount(1, 'A number, or leave it empty.', said.tooMany).optional(),
  tiers: z.array(tier, said.tiers).min(1, 'Give at least one price.').max(8, 'At most eight prices.'),
})

/** Where and when it is collected, and how the money comes. */
export const pickupTerms = (said: LotSayings) => ({
  placeKind: z.enum(['farm-gate', 'public-place'], { message: 'Where do people collect?' }),
  windows: z
    .array(windowOf(said), said.windows)
    .min(1, 'Offer at least one pickup window.')
    .max(40, said.manyWindows),
  accept: z.enum(['instant', 'ask'], said.accept),
  balanceDue: z.enum(['at-handover', 'before'], said.balanceDue),
})

export const batchPhoto = z
  .object({ photoId, takenOn: dayText, hasRuler: z.boolean(), caption: line(120).optional() })
  .strict()
