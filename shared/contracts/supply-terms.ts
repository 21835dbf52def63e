import { z } from 'zod'

import { askedDay, askedInt, freeLine, unitPriceCents } from '@/shared/contracts/asked'
import { pickupTerms, stockTerms, tierOf, type LotSayings } from '@/shared/contracts/lot-terms'
import { photoId, words } from '@/shared/contracts/values'

const sayings: Required<LotSayings> = {
  day: 'Which day? Pick one from the calendar.',
  time: 'A time, like 09:00.',
  manyBuyers: 'At most 500 buyers in one window.',
  window: 'A day and two times, like 09:00 to 10:00.',
  windows: 'Offer at least one pickup window.',
  manyWindows: 'At most forty pickup windows.',
  accept: 'Do you accept each order yourself, or take them at once?',
  balanceDue: 'Is the rest paid at the hand-over, or before it?',
  tier: 'From how many, and what each unit costs.',
  tiers: 'Give at least one price.',
  tooMany: 'At most a million.',
}

/** The same shape as a photo of fish; no ruler is asked for. */
const supplyPhoto = z
  .object(
    {
      photoId,
      takenOn: askedDay('On which day was the photo taken?'),
      hasRuler: z.boolean('Is a ruler in the photo? No is an answer.'),
      caption: freeLine(120),
    },
    'A photo of what you sell.',
  )
  .strict()

/** What worms, media and produce have in common with fish, under the same names. */
export const supplyTerms = (deposit: { least: number; most: number; leastFreeHours: number }) => ({
  ...stockTerms(tierOf(unitPriceCents, sayings), sayings),
  ...pickupTerms(sayings),
  depositPct: askedInt(deposit.least, deposit.most, `A deposit of ${deposit.least} to ${deposit.most} %.`),
  freeCancelHours: askedInt(
    deposit.leastFreeHours,
    336,
    `Until how many hours before may buyers cancel for free? ${deposit.leastFreeHours} to 336.`,
  ),
  photos: z
    .array(supplyPhoto, 'At least one photo of what you sell.')
    .min(1, 'At least one photo of what you sell.')
    .max(6, 'At most six photos.'),
  words: z.string('Tell buyers what they should know, or leave it empty.').pipe(words(2000)),
})
