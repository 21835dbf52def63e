import { z } from 'zod'

import { mostOrderCents } from '@/shared/domain/money/most-order-cents'
import { line, words } from '@/shared/contracts/values'

const orEmpty = 'In your own words, or leave it empty.'

/** Fields that must be answered; a missing answer says what to do, like a wrong one. */
export const askedLine = (most: number, saying: string) => z.string(saying).pipe(line(most).min(1, saying))
export const askedWords = (most: number, saying: string) => z.string(saying).pipe(words(most).min(1, saying))
/** May be left out. */
export const freeLine = (most: number) => z.string(orEmpty).pipe(line(most)).optional()
export const freeWords = (most: number) => z.string(orEmpty).pipe(words(most)).optional()
export const askedDay = (saying: string) => z.iso.date(saying)
export const askedTime = (saying: string) => z.string(saying).regex(/^([01]\d|2[0-3]):[0-5]\d$/, saying)
export const askedYesNo = (saying: string) => z.boolean(saying)
export const askedInt = (least: number, most: number, saying: string) =>
  z.int(saying).min(least, saying).max(most, saying)
export const askedNumber = (least: number, most: number, saying: string) =>
  z.number(saying).min(least, saying).max(most, saying)
export const askedState = z
  .string('Two letters of a state, like OH.')
  .regex(/^[A-Z]{2}$/, 'Two letters of a state, like OH.')

/** What one sale unit costs. */
export const unitPriceCents = z
  .int('A price for one unit, in dollars and cents.')
  .min(1, 'A price for one unit, at least one cent.')
  .max(mostOrderCents, 'At most $100,000.')
