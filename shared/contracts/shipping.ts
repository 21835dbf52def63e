import { z } from 'zod'

import { dayText } from '@/shared/contracts/values'

export const seasonVerdict = z.enum(['safe', 'safe-with-packs', 'too-cold', 'too-hot', 'unknown'])

/** Whether a batch usually arrives alive at the place asked for, in the week asked for. */
export const shippedTo = z.object({
  /** False: the seller does not ship to that state, whatever the weather. */
  isServed: z.boolean(),
  verdict: seasonVerdict,
  /** The Monday of that week. */
  monday: dayText,
  isThisWeek: z.boolean(),
  /** The Monday of the next safe week, where this one is not; absent: the year has none. */
  nextMonday: dayText.optional(),
})
export type ShippedTo = z.output<typeof shippedTo>

/** The same with the whole year. */
export const shippedThroughYear = shippedTo.extend({
  /** 1-52: the 53rd of a long year is judged as the 52nd. */
  week: z.int(),
  /** 52 of them, the first ISO week first. */
  weeks: z.array(seasonVerdict),
})
export type ShippedThroughYear = z.output<typeof shippedThroughYear>
