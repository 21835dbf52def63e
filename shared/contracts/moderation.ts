import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { listingBody, listingStates } from '@/shared/contracts/listings'
import { ruleReason } from '@/shared/contracts/rules'
import { instantText, pageOf, publicIdText, words } from '@/shared/contracts/values'

/** Why a moderator asks or rejects; `other` needs words of its own. */
export const reviewReasons = [
  'species-blocked',
  'species-doubtful',
  'photo-not-this-batch',
  'no-ruler',
  'papers-missing',
  'contact-details',
  'price-unclear',
  'unsafe-terms',
  'wild-caught',
  'duplicate',
  'other',
] as const

export const reviewRow = z.object({
  versionId: z.string(),
  listingId: publicIdText,
  title: z.string(),
  farmName: z.string(),
  state: z.string(),
  number: z.int(),
  flags: z.array(z.string()),
  submittedAt: instantText,
})
export type ReviewRow = z.output<typeof reviewRow>

export const listReviews = endpoint({
  method: 'GET',
  path: '/moderation/listings',
  auth: 'moderator',
  summary: 'Listing versions that wait for a decision, the riskiest first',
  query: z.object({
    cursor: z.string().max(400).optional(),
    limit: z.coerce.number().int().min(1).max(50).default(20),
  }),
  reply: pageOf(reviewRow),
})

export const review = z.object({
  versionId: z.string(),
  listingId: publicIdText,
  listingState: z.enum(listingStates),
  number: z.int(),
  title: z.string(),
  review: z.enum(['waiting', 'approved', 'asked', 'rejected', 'superseded']),
  flags: z.array(z.string()),
  submittedAt: instantText,
  body: listingBody,
  before: z.object({ number: z.int(), body: listingBody }).optional(),
  changes: z.array(
    z.object({ field: z.string(), before: z.string(), after: z.string(), material: z.boolean() }),
  ),
  photos: z.array(
    z.object({
      photoId: z.string(),
      widthPx: z.int(),
      heightPx: z.int(),
      ground: z.string(),
      alt: z.string(),
    }),
  ),
  seller: z.object({
    farmName: z.string(),
    kind: z.string(),
    state: z.string(),
    since: instantText,
    approvedBefore: z.int(),
    rejectedBefore: z.int(),
    licences: z.array(z.object({ state: z.string(), answer: z.string(), number: z.string().optional() })),
  }),
  rules: z.array(ruleReason),
  nextVersionId: z.string().optional(),
})
export type Review = z.output<typeof review>

const versionParams = z.object({ versionId: z.string().regex(/^\d{1,10}$/) })

export const readReview = endpoint({
  method: 'GET',
  path: '/moderation/listings/:versionId',
  auth: 'moderator',
  summary: 'One listing version with its difference to the one before',
  params: versionParams,
  reply: review,
})

export const decideReview = endpoint({
  method: 'POST',
  path: '/moderation/listings/:versionId/decision',
  auth: 'moderator',
  idempotent: true,
  summary: 'Approve, ask the seller, or reject with a reason',
  params: versionParams,
  body: z
    .object({
      decision: z.enum(['approve', 'ask', 'reject']),
      reason: z.enum(reviewReasons).optional(),
      note: words(600).optional(),
    })
    .strict()
    .superRefine((given, ctx) => {
      if (given.decision !== 'approve' && !given.reason) {
        ctx.addIssue({
          code: 'custom',
          path: ['reason'],
          message: 'A reason goes with every question and refusal.',
        })
      }
      if (
        given.decision !== 'approve' &&
        (given.decision === 'ask' || given.reason === 'other') &&
        !given.note
      ) {
        ctx.addIssue({
          code: 'custom',
          path: ['note'],
          message: 'Say in your own words what the seller should do.',
        })
      }
    }),
  reply: review,
})
