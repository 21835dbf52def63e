import { z } from 'zod'

import { checkStock, checkWindows } from '@/shared/contracts/check-lot'
import { batchPhoto, pickupTerms, stockTerms, tierOf, wholeCount } from '@/shared/contracts/lot-terms'
import { cents, dayText, line, stateCode, words } from '@/shared/contracts/values'
import { shipDays } from '@/shared/domain/shipping/ship-days'
import { packingClasses } from '@/shared/domain/season/season-classes.facts'
import { packingClassIds } from '@/shared/domain/season/season-lane'

const QUARTER_INCH_MM = 6.35
const TWO_INCHES_MM = 50.8

const quarterInches = z
  .number({ message: 'A length, like 2 1/4 in.' })
  .min(QUARTER_INCH_MM, 'At least a quarter of an inch.')
  .max(1524, 'At most 60 inches.')
  .refine(
    (mm) => Math.abs(mm / QUARTER_INCH_MM - Math.round(mm / QUARTER_INCH_MM)) < 0.01,
    'In quarter-inch steps.',
  )

export const priceTier = tierOf(cents.min(1, 'A price for each animal.'), {})
export type PriceTier = z.output<typeof priceTier>
export type { TypedWindow } from '@/shared/contracts/lot-terms'

/** How a batch may be shipped, to the states it is sold to; the packing says whether it is one night or two days. */
export const batchShipping = z
  .object({
    packing: z.enum(packingClassIds, { message: 'What do you pack them in, and how long is the way?' }),
    boxCents: cents.min(0, 'What you charge for a packed box; 0 is an answer.').max(100_000),
    freightCents: cents
      .min(0, 'What the carrier takes for one box; 0 if it is in your price.')
      .max(100_000, 'At most $1,000 a box.'),
    carrier: line(60).min(2, 'Which carrier and service, in your words?'),
    carrierAccepts: z.literal(true, {
      message: 'Ask your carrier whether it takes these animals in this service, then tick this.',
    }),
    holdsAtCounter: z.boolean(),
    mostInBox: wholeCount(1, 'The most animals you put in one box.'),
    days: z
      .array(z.enum(shipDays))
      .min(1, 'On which days do you ship?')
      .refine((days) => new Set(days).size === days.length, 'Each day once.'),
  })
  .strict()
export type BatchShipping = z.output<typeof batchShipping>

/**
 * A batch of fish (crayfish and prawns too) as published: rules of trade practice, one message a field.
 * Checks that need today's date or the law run in the use case that submits it.
 */
export const fishBody = z
  .object({
    category: z.literal('fish'),
    taxonId: z
      .string({ message: 'Pick the species from the list.' })
      .min(1, 'Pick the species from the list.')
      .max(60),
    strain: line(80).optional(),
    stage: z.enum(['fry', 'fingerling', 'advanced-fingerling', 'juvenile', 'adult', 'breeder'], {
      message: 'Which stage?',
    }),
    sizeLoMm: quarterInches,
    sizeHiMm: quarterInches,
    ungraded: z.boolean(),
    hatchedOn: dayText,
    readyOn: dayText.optional(),
    ...stockTerms(priceTier, {}),
    countMethod: z.enum(['hand', 'sample-weight', 'displacement'], { message: 'How do you count?' }),
    overcountPct: z.int().min(0).max(15, 'At most 15 %.'),
    sex: z.enum(['mixed', 'all-male', 'unknown'], { message: 'Mixed, all-male or unknown?' }),
    sexClaimPct: z.int().min(50).max(100).optional(),
    feed: z
      .object({ onPellets: z.boolean(), since: dayText.optional(), words: line(160).optional() })
      .strict(),
    water: z
      .object({
        temperatureC: z.number({ message: 'The water temperature.' }).min(0, 'Not below freezing.').max(40),
        pH: z.number({ message: 'The pH.' }).min(4).max(10),
        ghPpm: z.number({ message: 'General hardness in ppm.' }).min(0).max(2000),
        khPpm: z.number({ message: 'Carbonate hardness in ppm.' }).min(0).max(2000),
        saltPpt: z.number().min(0).max(40),
        source: z.enum(['well', 'town', 'rain', 'spring', 'pond'], {
          message: 'Where does the water come from?',
        }),
        measuredOn: dayText,
      })
      .strict(),
    origin: z.enum(['hatched-here', 'grown-on', 'bought-in'], { message: 'Where do they come from?' }),
    originState: stateCode.optional(),
    wildCaught: z.literal(false, { message: 'Wild-caught animals are not listed here.' }),
    health: z
      .object({
        treatments: words(400).min(1, 'What treatments in the last 30 days? "None" is an answer.'),
        lastLosses: words(400).min(1, 'When did you last lose animals, and how many? "None" is an answer.'),
        papers: words(400).optional(),
      })
      .strict(),
    singleSpeciesChecked: z.literal(true, {
      message: 'Please check the batch and confirm it holds one species.',
    }),
    licenceNumbers: words(300).min(1, 'Your licence or permit numbers, or "none needed" and why.'),
    statesServed: z.array(stateCode).min(1, 'Which states do you serve?').max(51),
    ...pickupTerms({}),
    depositPct: z.int({ message: '10 to 50 %.' }).min(10, '10 to 50 %.').max(50, '10 to 50 %.'),
    freeCancelHours: z.int().min(12).max(336),
    promise: z
      .object({
        windowHours: z.int().min(4, '4 to 24 hours.').max(24, '4 to 24 hours.'),
        survivalDays: z.union([z.literal(0), z.int().min(3).max(7)]),
        remedy: z.enum(['refund', 'replace']),
        evidence: line(200).min(1, 'What should the buyer show you?'),
      })
      .strict(),
    shipping: batchShipping.optional(),
    photos: z.array(batchPhoto).min(1, 'At least one photo of this batch.').max(6, 'At most six photos.'),
    words: words(2000),
  })
  .strict()
  .superRefine((batch, ctx) => {
    const wrong = (path: (string | number)[], message: string) =>
      ctx.addIssue({ code: 'custom', path, message })
    if (batch.sizeHiMm < batch.sizeLoMm)
      wrong(['sizeHiMm'], 'The longest cannot be shorter than the shortest.')
    if (batch.sizeHiMm - batch.sizeLoMm > TWO_INCHES_MM + 0.01 && !batch.ungraded) {
      wrong(['ungraded'], 'A spread of more than 2 inches is an ungraded batch: tick it, or grade them.')
    }
    checkStock(batch, wrong)
    if (batch.origin === 'bought-in' && !batch.originState) wrong(['originState'], 'From which state?')
    if (!batch.photos.some((photo) => photo.hasRuler)) {
      wrong(['photos'], 'One photo must show the animals beside a ruler.')
    }
    const { shipping } = batch
    if (shipping && packingClasses[shipping.packing].nights > 1 && shipping.days.includes('wed')) {
      wrong(
        ['shipping', 'days'],
        'Two days on the way: ship on Monday or Tuesday, so that no box waits over a weekend.',
      )
    }
    checkWindows(batch, wrong)
  })
export type FishBody = z.output<typeof fishBody>
