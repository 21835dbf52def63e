import { and, asc, eq, gt, inArray, lt, sql } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listing, listingVersion, pickupWindow } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'
import type { ListingBody } from '@/shared/contracts/listings'

export interface ListingFacts {
  listingId: number
  sellerId: number
  free: number
  body: ListingBody
  state: string
  cellLat: number
  cellLng: number
  ratingCount: number
  ratingSum: number
}

/** Listings that are live with an approved version, of sellers who can be paid. The others are not to be found. */
export async function readSellable(tx: Tx, listingIds: number[]): Promise<ListingFacts[]> {
  const rows = await tx
    .select({
      listingId: listing.id,
      sellerId: listing.sellerId,
      free: listing.free,
      body: listingVersion.body,
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
    .where(and(inArray(listing.id, listingIds), eq(listing.state, 'live'), eq(seller.chargesEnabled, true)))
  return rows.map((row) => ({ ...row, body: row.body as ListingBody }))
}

export interface OpenWindow {
  listingId: number
  startsAt: Date
  zone: string
}

/** Windows to come with a place left, the soonest first. */
export async function readWindowsWithRoom(
  listingIds: number[],
  at: Date,
  tx: Tx = db(),
): Promise<OpenWindow[]> {
  if (listingIds.length === 0) return []
  return tx
    .select({ listingId: pickupWindow.listingId, startsAt: pickupWindow.startsAt, zone: pickupWindow.zone })
    .from(pickupWindow)
    .where(
      and(
        inArray(pickupWindow.listingId, listingIds),
        gt(pickupWindow.startsAt, at),
        eq(pickupWindow.closed, 0),
        lt(pickupWindow.taken, sql`${pickupWindow.capacity}`),
      ),
    )
    .orderBy(asc(pickupWindow.startsAt), asc(pickupWindow.id))
}
