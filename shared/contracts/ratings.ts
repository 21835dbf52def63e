import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { instantText, pageOf, publicIdText, words } from '@/shared/contracts/values'

const MOST_WORDS = 600

const mark = z.int({ message: 'Choose a mark from 1 to 5.' }).min(1, 'From 1 to 5.').max(5, 'From 1 to 5.')
const marks = z.object({ fish: mark, count: mark, contact: mark }).strict()
export type Marks = z.output<typeof marks>

/** The only causes for hiding words; being negative is none of them. */
export const hidingReasons = ['personal-data', 'threats', 'not-this-order'] as const
export type HidingReason = (typeof hidingReasons)[number]

export const shownRating = z.object({
  ratingId: publicIdText,
  /** First name and initial. */
  buyerName: z.string(),
  marks,
  words: z.string().optional(),
  wordsHidden: z.enum(hidingReasons).optional(),
  writtenAt: instantText,
  editedAt: instantText.optional(),
  /** The end of the buyer's time to change it. */
  editableUntil: instantText,
  reply: z
    .object({ words: z.string().optional(), hidden: z.enum(hidingReasons).optional(), at: instantText })
    .optional(),
})
export type ShownRating = z.output<typeof shownRating>

/** Day 7 of one order. */
export const shownSurvival = z.object({
  handedOver: z.int(),
  askedFrom: instantText,
  openUntil: instantText,
  alive: z.int().optional(),
})
export type ShownSurvival = z.output<typeof shownSurvival>

const orderParams = z.object({ orderId: publicIdText })
const ratingBody = z.object({ marks, words: words(MOST_WORDS).default('') }).strict()

export const rateOrder = endpoint({
  method: 'POST',
  path: '/orders/:orderId/rating',
  auth: 'member',
  idempotent: true,
  status: 201,
  summary: 'The buyer rates an order that was handed over, once',
  params: orderParams,
  body: ratingBody,
  reply: shownRating,
})

export const changeRating = endpoint({
  method: 'PATCH',
  path: '/orders/:orderId/rating',
  auth: 'member',
  summary: 'The buyer changes a rating within 14 days',
  params: orderParams,
  body: ratingBody,
  reply: shownRating,
})

export const replyToRating = endpoint({
  method: 'POST',
  path: '/orders/:orderId/rating/reply',
  auth: 'member',
  idempotent: true,
  status: 201,
  summary: 'The seller replies to a rating, once',
  params: orderParams,
  body: z.object({ words: words(MOST_WORDS).min(1, 'Write a sentence or two.') }).strict(),
  reply: shownRating,
})

export const answerSurvival = endpoint({
  method: 'POST',
  path: '/orders/:orderId/survival',
  auth: 'member',
  idempotent: true,
  summary: 'The buyer says how many are alive after 7 days, or corrects it',
  params: orderParams,
  body: z.object({ alive: z.int({ message: 'How many are alive? A whole number.' }).min(0) }).strict(),
  reply: shownSurvival,
})

export const listRatings = endpoint({
  method: 'GET',
  path: '/sellers/:sellerId/ratings',
  auth: 'public',
  summary: "A seller's ratings with replies, newest first",
  params: z.object({ sellerId: publicIdText }),
  query: z.object({
    cursor: z.string().max(400).optional(),
    limit: z.coerce.number().int().min(1).max(50).default(10),
  }),
  reply: pageOf(shownRating),
})

export const hideRatingWords = endpoint({
  method: 'POST',
  path: '/moderation/ratings/:ratingId/hiding',
  auth: 'moderator',
  idempotent: true,
  summary: 'Hide the words of a rating or of its reply; the marks keep counting',
  params: z.object({ ratingId: publicIdText }),
  body: z.object({ part: z.enum(['words', 'reply']), reason: z.enum(hidingReasons) }).strict(),
  reply: shownRating,
})
