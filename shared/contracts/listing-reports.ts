import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { listingStates } from '@/shared/contracts/listings'
import { instantText, pageOf, publicIdText, words } from '@/shared/contracts/values'
import { takeDownReasons } from '@/shared/domain/listings/take-down-reasons'

const MOST_WORDS = 600

/** What a member says is wrong; `other` needs words of its own. */
export const reportReasons = [
  'species',
  'not-as-told',
  'bad-state',
  'unlawful',
  'contact-details',
  'other',
] as const
export type ReportReason = (typeof reportReasons)[number]

const listingParams = z.object({ listingId: publicIdText })

export const madeReport = z.object({
  reason: z.enum(reportReasons),
  words: z.string().optional(),
  reportedAt: instantText,
})
export type MadeReport = z.output<typeof madeReport>

export const reportListing = endpoint({
  method: 'POST',
  path: '/listings/:listingId/reports',
  auth: 'member',
  idempotent: true,
  status: 201,
  summary: 'Tell the moderators what is wrong with a listing; one open report of a member stands',
  params: listingParams,
  body: z
    .object({
      reason: z.enum(reportReasons, { message: 'What is wrong? Choose the nearest.' }),
      words: words(MOST_WORDS).optional(),
    })
    .strict()
    .refine((given) => given.reason !== 'other' || Boolean(given.words), {
      path: ['words'],
      message: 'Say in a sentence or two what is wrong.',
    }),
  reply: madeReport,
})

/** One listing with all its open reports. Who reported is nobody's business, not even on the desk. */
export const reportedListing = z.object({
  listingId: publicIdText,
  title: z.string(),
  farmName: z.string(),
  state: z.enum(listingStates),
  people: z.int(),
  /** The newest first, at most three. */
  newest: z.array(madeReport),
  firstAt: instantText,
  newestAt: instantText,
  openOrders: z.int(),
})
export type ReportedListing = z.output<typeof reportedListing>

export const listReportedListings = endpoint({
  method: 'GET',
  path: '/moderation/reported-listings',
  auth: 'moderator',
  summary: 'Listings with open reports, those that have waited longest first',
  query: z.object({
    cursor: z.string().max(400).optional(),
    limit: z.coerce.number().int().min(1).max(50).default(20),
  }),
  reply: pageOf(reportedListing),
})

const closedReports = z.object({
  listingId: publicIdText,
  state: z.enum(listingStates),
  /** How many reports this closed. */
  closed: z.int(),
})

/** `seenUntil` is the newest report the moderator has read: what came after it is not decided unread. */
const seenUntil = instantText

export const dismissReports = endpoint({
  method: 'POST',
  path: '/moderation/reported-listings/:listingId/dismissal',
  auth: 'moderator',
  idempotent: true,
  summary: 'Nothing wrong: close all open reports of a listing',
  params: listingParams,
  body: z.object({ seenUntil, note: words(MOST_WORDS).optional() }).strict(),
  reply: closedReports,
})

export const takeDownListing = endpoint({
  method: 'POST',
  path: '/moderation/reported-listings/:listingId/take-down',
  auth: 'moderator',
  idempotent: true,
  summary: 'Take a reported listing off sale for good, with the reason for its seller',
  params: listingParams,
  body: z
    .object({
      reason: z.enum(takeDownReasons, { message: 'A reason goes with it.' }),
      note: words(MOST_WORDS).optional(),
    })
    .strict()
    .refine((given) => given.reason !== 'other' || Boolean(given.note), {
      path: ['note'],
      message: 'Say in your own words why it goes off sale.',
    }),
  reply: closedReports,
})
