import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { line, publicIdText, stateCode, words, zipCode, zoneName } from '@/shared/contracts/values'

export const sellerKinds = ['hatchery', 'grower'] as const

/** What a seller says about the licence one state asks for. */
export const licenceAnswer = z
  .object({
    state: stateCode,
    answer: z.enum(['have', 'not-needed', 'unsure']),
    number: line(60).optional(),
  })
  .strict()
  .refine((given) => given.answer !== 'have' || Boolean(given.number), {
    path: ['number'],
    message: 'Please give the licence or permit number.',
  })
export type LicenceAnswer = z.output<typeof licenceAnswer>

export const farm = z
  .object({
    farmName: line(80).min(2, 'Please name your farm or hatchery.'),
    about: words(1200),
    kind: z.enum(sellerKinds),
    street: line(120).min(3, 'Where do people collect? Street and number.'),
    city: line(64).min(2, 'Which town?'),
    state: stateCode,
    zip: zipCode,
    phone: line(24).regex(/^[+()\d][\d ()+.-]{6,22}$/, 'A phone number, like (513) 555-0142.'),
    zone: zoneName.optional(),
    licences: z
      .array(licenceAnswer)
      .min(1, 'Answer the licence question for at least your own state.')
      .max(60),
  })
  .strict()

export const ownSeller = z.object({
  sellerId: publicIdText,
  farmName: z.string(),
  about: z.string(),
  kind: z.enum(sellerKinds),
  street: z.string(),
  city: z.string(),
  state: stateCode,
  zip: zipCode,
  phone: z.string(),
  zone: zoneName,
  licences: z.array(licenceAnswer),
  publicPlace: z.object({ label: z.string(), lat: z.number(), lng: z.number() }),
  payouts: z.enum(['not-started', 'unfinished', 'ready']),
})
export type OwnSeller = z.output<typeof ownSeller>

/** What all of a seller's day-7 answers say. */
export const survivalRecord = z.object({
  alive: z.int(),
  handedOver: z.int(),
  answered: z.int(),
  asked: z.int(),
})
export type SurvivalRecord = z.output<typeof survivalRecord>

/** The public face: no street, no phone, the place as a cell. */
export const sellerCard = z.object({
  sellerId: publicIdText,
  farmName: z.string(),
  kind: z.enum(sellerKinds),
  placeText: z.string(),
  state: stateCode,
  rating: z.object({ mean: z.number(), count: z.int() }).optional(),
  survival: survivalRecord.optional(),
  answerRate: z.object({ inTime: z.int(), asked: z.int() }).optional(),
  since: z.string(),
})
export type SellerCard = z.output<typeof sellerCard>

export const openFarm = endpoint({
  method: 'POST',
  path: '/sellers',
  auth: 'member',
  idempotent: true,
  status: 201,
  summary: 'Begin selling: farm, place and licence answers',
  body: farm,
  reply: ownSeller,
})

export const readOwnFarm = endpoint({
  method: 'GET',
  path: '/sellers/mine',
  auth: 'seller',
  summary: "The seller's own record",
  reply: ownSeller,
})

export const changeFarm = endpoint({
  method: 'PATCH',
  path: '/sellers/mine',
  auth: 'seller',
  summary: "Change the seller's own record",
  body: farm,
  reply: ownSeller,
})

export const startPayouts = endpoint({
  method: 'POST',
  path: '/sellers/mine/payout-onboarding',
  auth: 'seller',
  idempotent: true,
  status: 201,
  summary: "A link to the payment processor's own onboarding page",
  reply: z.object({ url: z.string() }),
})

export const readSeller = endpoint({
  method: 'GET',
  path: '/sellers/:sellerId',
  auth: 'public',
  summary: "A seller's public page",
  params: z.object({ sellerId: publicIdText }),
  reply: sellerCard.extend({
    about: z.string(),
    /** Mean of each mark; absent before the first rating. */
    marks: z.object({ fish: z.number(), count: z.number(), contact: z.number() }).optional(),
    licences: z.array(z.object({ state: stateCode, answer: z.string() })),
  }),
})
