import { z } from 'zod'

import { endpoint } from '@/shared/api/endpoint'
import { shippedTo } from '@/shared/contracts/shipping'
import { cents, dayText, pageOf, publicIdText, stateCode } from '@/shared/contracts/values'

export const categories = ['fish', 'worms', 'media', 'produce'] as const
export const searchSorts = ['nearest', 'cheapest', 'soonest', 'best-rated'] as const

const wholeNumber = (least: number, most: number) => z.coerce.number().int().min(least).max(most)

const nearText = z
  .string()
  .regex(/^(\d{5}|\d{2,3}\.\d{1,4}\.\d{1,4})$/, 'A ZIP code or a place from the list.')

/** `near` is a ZIP or a location cell id: a finer point never leaves the device. */
export const searchFilters = z.object({
  near: nearText,
  withinKm: wholeNumber(1, 4000).default(160),
  category: z.enum(categories).optional(),
  species: z.string().max(60).optional(),
  sizeFromMm: z.coerce.number().min(0).max(2000).optional(),
  sizeToMm: z.coerce.number().min(0).max(2000).optional(),
  count: wholeNumber(1, 1_000_000).optional(),
  from: dayText.optional(),
  until: dayText.optional(),
  mostCents: wholeNumber(1, 10_000_000).optional(),
  pickup: z.enum(['yes', 'any']).default('any'),
  /** Either of the two asks for what may be shipped: to `shipTo` (else to `near`) in ISO week `shipWeek` (else this one). */
  shipTo: nearText.optional(),
  shipWeek: wholeNumber(1, 53).optional(),
})

export const searchQuery = searchFilters.extend({
  sort: z.enum(searchSorts).default('nearest'),
  limit: wholeNumber(1, 50).default(24),
  cursor: z.string().max(400).optional(),
})
export type SearchFilters = z.output<typeof searchFilters>
export type SearchAsked = z.input<typeof searchQuery>

/** One tag in the results. Every figure is public: distances run between cell centres. */
export const foundListing = z.object({
  listingId: publicIdText,
  category: z.enum(categories),
  title: z.string(),
  scientificName: z.string().optional(),
  speciesId: z.string().optional(),
  stage: z.string().optional(),
  sizeLoMm: z.number().optional(),
  sizeHiMm: z.number().optional(),
  /** Of media and produce. */
  material: z.string().optional(),
  cropId: z.string().optional(),
  /** One unit in words, of everything but fish: 'head', '250 worms'. */
  soldBy: z.string().optional(),
  /** The price offers are compared by, such as $9.33/lb; left out where a unit holds no measured amount. */
  comparable: z.object({ us: z.string(), metric: z.string() }).optional(),
  free: z.int(),
  minOrder: z.int(),
  unitCents: cents,
  /** Landed cost of the asked count, when a count was asked. */
  totalCents: cents.optional(),
  waterC: z.number().optional(),
  farmName: z.string(),
  placeText: z.string(),
  state: stateCode,
  lat: z.number(),
  lng: z.number(),
  distanceKm: z.number(),
  bearing: z.string(),
  nextPickup: z.object({ startsAt: z.string(), zone: z.string() }).optional(),
  rating: z.object({ mean: z.number(), count: z.int() }).optional(),
  photo: z.object({ photoId: z.string(), ground: z.string(), alt: z.string() }).optional(),
  legal: z.object({ status: z.string(), buy: z.string() }),
  /** Of a batch that may be shipped. */
  shipped: shippedTo.optional(),
})
export type FoundListing = z.output<typeof foundListing>

/** A tag on a seller's page: without a place of the reader there is neither distance nor law to tell. */
export const sellerListing = foundListing.partial({ distanceKm: true, bearing: true, legal: true })
export type SellerListing = z.output<typeof sellerListing>

export const listSellerListings = endpoint({
  method: 'GET',
  path: '/sellers/:sellerId/listings',
  auth: 'public',
  summary: 'What a seller has on sale now, the newest first; distance and legal status for the place given',
  params: z.object({ sellerId: publicIdText }),
  query: z.object({
    near: searchFilters.shape.near.optional(),
    limit: wholeNumber(1, 50).default(12),
    cursor: z.string().max(400).optional(),
  }),
  reply: pageOf(sellerListing),
})

export const searchListings = endpoint({
  method: 'GET',
  path: '/listings',
  auth: 'public',
  summary: 'Search listings by place, distance, species, size, count, day and price',
  query: searchQuery,
  reply: z.object({
    items: z.array(foundListing),
    nextCursor: z.string().optional(),
    /** The Monday of this week by the product's clock. */
    thisMonday: dayText,
    place: z.object({ label: z.string(), state: stateCode, lat: z.number(), lng: z.number() }),
  }),
})

export const countFacets = endpoint({
  method: 'GET',
  path: '/listing-facets',
  auth: 'public',
  summary: 'How many listings each category and species has inside the circle',
  query: searchFilters,
  reply: z.object({
    categories: z.array(z.object({ category: z.enum(categories), count: z.int(), atLeast: z.boolean() })),
    species: z.array(z.object({ speciesId: z.string(), count: z.int(), atLeast: z.boolean() })),
  }),
})

export const findPins = endpoint({
  method: 'GET',
  path: '/listing-pins',
  auth: 'public',
  summary: 'Marks for the map: single places or clusters inside the bounds',
  query: z.object({
    category: z.enum(categories).optional(),
    south: z.coerce.number().min(-90).max(90),
    north: z.coerce.number().min(-90).max(90),
    west: z.coerce.number().min(-180).max(180),
    east: z.coerce.number().min(-180).max(180),
    zoom: wholeNumber(0, 16),
  }),
  reply: z.object({
    pins: z.array(z.object({ id: z.string(), lat: z.number(), lng: z.number(), count: z.int() })),
  }),
})
