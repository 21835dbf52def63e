import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { fishBody } from '@/shared/contracts/fish-batch'
import { mediaBody } from '@/shared/contracts/media-lot'
import { produceBody } from '@/shared/contracts/produce-lot'
import { wormBody } from '@/shared/contracts/worm-lot'
import { gateVerdict } from '@/shared/contracts/rules'
import { shippedThroughYear } from '@/shared/contracts/shipping'
import { sellerCard } from '@/shared/contracts/sellers'
import { instantText, line, pageOf, publicIdText } from '@/shared/contracts/values'
import { takeDownReasons } from '@/shared/domain/listings/take-down-reasons'

export const listingStates = [
  'draft',
  'pending_review',
  'live',
  'paused',
  'sold_out',
  'expired',
  'taken_down',
] as const

/** What a seller has typed so far: each part may be missing or not valid yet; only the size is checked. */
export const listingDraft = z
  .record(z.string().max(40), z.unknown())
  .refine((draft) => JSON.stringify(draft).length <= 20_000, 'That is more text than one listing can hold.')
export type ListingDraft = z.output<typeof listingDraft>

export const listingBody = z.discriminatedUnion('category', [fishBody, wormBody, mediaBody, produceBody])
export type ListingBody = z.output<typeof listingBody>

const listingParams = z.object({ listingId: publicIdText })

export const shownWindow = z.object({
  windowId: publicIdText,
  startsAt: instantText,
  endsAt: instantText,
  zone: z.string(),
  placesLeft: z.int(),
  placeKind: z.string(),
})
export type ShownWindow = z.output<typeof shownWindow>

/** The public listing page. `body` holds no seller-only words. */
export const shownListing = z.object({
  listingId: publicIdText,
  state: z.enum(listingStates),
  title: z.string(),
  body: listingBody,
  version: z.int(),
  free: z.int(),
  seller: sellerCard,
  distanceKm: z.number().optional(),
  bearing: z.string().optional(),
  lat: z.number(),
  lng: z.number(),
  windows: z.array(shownWindow),
  gate: gateVerdict.optional(),
  /** Of a batch that may be shipped, once a place is said. */
  shipped: shippedThroughYear.optional(),
  photos: z.array(
    z.object({
      photoId: z.string(),
      widthPx: z.int(),
      heightPx: z.int(),
      ground: z.string(),
      alt: z.string(),
    }),
  ),
  /** How many other listings this seller has on sale. */
  alsoOnSale: z.int(),
  may: z.array(z.enum(['reserve', 'edit', 'report', 'review'])),
})
export type ShownListing = z.output<typeof shownListing>

export const readListing = endpoint({
  method: 'GET',
  path: '/listings/:listingId',
  auth: 'public',
  summary: 'One listing, with the legal status for the place given',
  params: listingParams,
  query: z.object({ near: z.string().max(24).optional() }),
  reply: shownListing,
})

export const ownListing = z.object({
  listingId: publicIdText,
  state: z.enum(listingStates),
  title: z.string(),
  draft: listingDraft,
  draftRevision: z.int(),
  liveVersion: z.int().optional(),
  review: z
    .object({
      number: z.int(),
      state: z.string(),
      reasonCode: z.string().optional(),
      reasonText: z.string().optional(),
      /** Why it waits, a sentence each, where something about it asks for a moderator. */
      why: z.array(z.string()).optional(),
    })
    .optional(),
  takenDown: z.object({ reason: z.enum(takeDownReasons), note: z.string().optional() }).optional(),
  stock: z.object({
    free: z.int(),
    held: z.int(),
    pledged: z.int(),
    sold: z.int(),
    shipped: z.int(),
    delivered: z.int(),
  }),
  windows: z.array(shownWindow),
  openOrders: z.int(),
  updatedAt: instantText,
  may: z.array(z.enum(['edit', 'submit', 'pause', 'resume', 'discard'])),
})
export type OwnListing = z.output<typeof ownListing>

export const listOwnListings = endpoint({
  method: 'GET',
  path: '/sellers/mine/listings',
  auth: 'seller',
  summary: "The seller's listings, newest change first",
  query: z.object({
    cursor: z.string().max(400).optional(),
    limit: z.coerce.number().int().min(1).max(50).default(20),
  }),
  reply: pageOf(ownListing),
})

export const beginListing = endpoint({
  method: 'POST',
  path: '/sellers/mine/listings',
  auth: 'seller',
  idempotent: true,
  status: 201,
  summary: 'Begin a draft, empty or copied from a listing of one’s own',
  body: z.object({ copyOf: publicIdText.optional() }).strict(),
  reply: ownListing,
})

export const readOwnListing = endpoint({
  method: 'GET',
  path: '/sellers/mine/listings/:listingId',
  auth: 'seller',
  summary: "One of the seller's listings with its draft",
  params: listingParams,
  reply: ownListing,
})

export const saveDraft = endpoint({
  method: 'PATCH',
  path: '/sellers/mine/listings/:listingId',
  auth: 'seller',
  summary: 'Keep what was typed; a newer draft elsewhere is a 409, never overwritten',
  params: listingParams,
  body: z.object({ draft: listingDraft, draftRevision: z.int().min(0) }).strict(),
  reply: z.object({ draftRevision: z.int(), savedAt: instantText }),
})

export const submitListing = endpoint({
  method: 'POST',
  path: '/sellers/mine/listings/:listingId/submission',
  auth: 'seller',
  idempotent: true,
  summary: 'Publish the draft: checked whole, then live or waiting for a moderator',
  params: listingParams,
  body: z.object({ draftRevision: z.int().min(0) }).strict(),
  reply: ownListing,
})

export const changeSelling = endpoint({
  method: 'POST',
  path: '/sellers/mine/listings/:listingId/selling',
  auth: 'seller',
  summary: 'Pause a live listing, or take it up again',
  params: listingParams,
  body: z.object({ selling: z.enum(['paused', 'live']) }).strict(),
  reply: ownListing,
})

export const discardDraft = endpoint({
  method: 'DELETE',
  path: '/sellers/mine/listings/:listingId',
  auth: 'seller',
  status: 204,
  summary: 'Throw away a draft that was never submitted',
  params: listingParams,
})

export const cutHarvest = endpoint({
  method: 'POST',
  path: '/listings/:listingId/harvest',
  auth: 'seller',
  idempotent: true,
  summary: 'Fewer are there than were sold: the last units in order time are cut and refunded',
  params: listingParams,
  body: z
    .object({
      /** Whole units that are really there, for orders not handed over yet and for sale. */
      count: z.int('How many are there? A whole number.').min(0, 'How many are there? 0 is an answer.'),
      note: line(200).optional(),
    })
    .strict(),
  reply: z.object({
    listing: ownListing,
    /** Orders that were cut or ended, the last one made first. */
    cut: z.array(z.object({ orderId: publicIdText, units: z.int(), left: z.int(), refundCents: z.int() })),
    /** Units that were still free and are no longer offered. */
    unsold: z.int(),
  }),
})

export const stockAdjustment = z
  .object({
    change: z.int().min(-1_000_000).max(1_000_000),
    reason: z.enum(['die-off', 'regraded', 'recount', 'more-ready', 'used-here']),
    note: line(200).optional(),
  })
  .strict()
  .refine((given) => given.change !== 0, { path: ['change'], message: 'By how many does the count change?' })

export const adjustStock = endpoint({
  method: 'POST',
  path: '/sellers/mine/listings/:listingId/stock-movements',
  auth: 'seller',
  idempotent: true,
  status: 201,
  summary: 'Correct the free count, with the reason',
  params: listingParams,
  body: stockAdjustment,
  reply: ownListing,
})
