import { desc, eq } from 'drizzle-orm'

import { db } from '@/db/client'
import { listing } from '@/db/schema/listings'

/** One sitemap file may name 50,000 addresses (sitemaps.org protocol 0.9); the newest come first. */
const MOST_ADDRESSES = 49_000

export async function listPublicListings(): Promise<{ publicId: string; updatedAt: Date }[]> {
  return db()
    .select({ publicId: listing.publicId, updatedAt: listing.updatedAt })
    .from(listing)
    .where(eq(listing.state, 'live'))
    .orderBy(desc(listing.updatedAt))
    .limit(MOST_ADDRESSES)
}
