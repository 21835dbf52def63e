import { z } from 'zod'

import { mostOrderCents } from '@/shared/domain/money/most-order-cents'

/** Shapes that several nouns share. Ids are opaque; money is integer cents; times are UTC with Z. */
export const publicIdText = z.string().regex(/^[A-Za-z0-9_-]{22}$/)
export const instantText = z.iso.datetime()
export const dayText = z.iso.date()
export const cents = z
  .int()
  .min(0, 'An amount cannot be below zero.')
  .max(mostOrderCents, 'At most $100,000.')
export const stateCode = z.string().regex(/^[A-Z]{2}$/)
export const zipCode = z.string().regex(/^\d{5}$/, 'Five digits, please.')
export const cellIdText = z.string().regex(/^\d{2,3}\.\d{1,4}\.\d{1,4}$/)
export const zoneName = z.string().min(3).max(40)
/** A zone that this program can compute with. */
export const knownZone = zoneName.refine((zone) => {
  try {
    return new Intl.DateTimeFormat('en-US', { timeZone: zone }).resolvedOptions().timeZone !== ''
  } catch {
    return false
  }
}, 'That time zone is not known here.')
export const wallTime = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'A time such as 22:00, please.')
export const photoId = z.string().regex(/^[0-9a-f]{32}$/)
export const unitSystem = z.enum(['us', 'metric'])
export const themeChoice = z.enum(['system', 'light', 'dark'])

/** One line of a person's own words: trimmed, no control characters. */
export const line = (most: number) =>
  z
    .string()
    .trim()
    .max(most, `At most ${most} characters.`)
    .refine((text) => !/[\u0000-\u001f\u007f]/u.test(text), 'One line, without special control characters.')

/** Several lines of a person's own words. */
export const words = (most: number) =>
  z
    .string()
    .trim()
    .max(most, `At most ${most} characters.`)
    .refine(
      (text) => !/[\u0000-\u0008\u000b-\u001f\u007f]/u.test(text),
      'Without special control characters.',
    )

export const pageOf = <T extends z.ZodType>(one: T) =>
  z.object({ items: z.array(one), nextCursor: z.string().optional() })
