import { and, eq, inArray } from 'drizzle-orm'

import { db } from '@/db/client'
import { listing, listingVersion } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'
import type { ListingBody } from '@/shared/contracts/listings'

export interface FoundFacts {
  listingId: number
  publicId: string
  free: number
  body: ListingBody
  farmName: string
  city: string
  state: string
  cellLat: number
  cellLng: number
  ratingCount: number
  ratingSum: number
}

/** What the tags of these listings show, by listing; one query for all. */
export async function readFound(listingIds: number[]): Promise<Map<number, FoundFacts>> {
  if (listingIds.length === 0) return new Map()
  const rows = await db()
    .select({
      listingId: listing.id,
      publicId: listing.publicId,
      free: listing.free,
      body: listingVersion.body,
      farmName: seller.farmName,
      city: seller.city,
      state: seller.state,
      cellLat: seller.cellLat,
      cellLng: seller.cellLng,
      ratingCount: seller.ratingCount,
      ratingSum: seller.ratingSum,
    })
    .from(listing)
    .innerJoin(
      listingVersion,
      and(eq(listingVersion.listingId, listing.id), eq(listingVersion.number, listing.liveVersion)),
    )
    .innerJoin(seller, eq(seller.id, listing.sellerId))
    .where(inArray(listing.id, listingIds))
  return new Map(rows.map((row) => [row.listingId, { ...row, body: row.body as ListingBody }]))
}
