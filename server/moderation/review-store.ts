import { and, asc, count, desc, eq, gt, lt, ne, notInArray, or } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listing, listingVersion } from '@/db/schema/listings'
import { seller } from '@/db/schema/sellers'
import type { ListingBody } from '@/shared/contracts/listings'

/** The riskiest first, and among equals the one that has waited longest. */
export interface QueuePlace {
  risk: number
  submittedAt: Date
  id: number
}

export interface QueueRow extends QueuePlace {
  listingPublicId: string
  listingState: string
  number: number
  flags: string[]
  body: ListingBody
  farmName: string
}

const place = (after: QueuePlace) =>
  or(
    lt(listingVersion.risk, after.risk),
    and(
      eq(listingVersion.risk, after.risk),
      or(
        gt(listingVersion.submittedAt, after.submittedAt),
        and(eq(listingVersion.submittedAt, after.submittedAt), gt(listingVersion.id, after.id)),
      ),
    ),
  )

/** Versions that wait for a decision, without those this moderator has a stake in. */
export async function listWaiting(
  except: { memberId: string; categories: string[] },
  page: { after: QueuePlace | null; limit: number },
): Promise<QueueRow[]> {
  const rows = await db()
    .select({
      id: listingVersion.id,
      risk: listingVersion.risk,
      submittedAt: listingVersion.submittedAt,
      listingPublicId: listing.publicId,
      listingState: listing.state,
      number: listingVersion.number,
      flags: listingVersion.flags,
      body: listingVersion.body,
      farmName: seller.farmName,
    })
    .from(listingVersion)
    .innerJoin(listing, eq(listing.id, listingVersion.listingId))
    .innerJoin(seller, eq(seller.id, listing.sellerId))
    .where(
      and(
        eq(listingVersion.review, 'waiting'),
        ne(seller.memberId, except.memberId),
        except.categories.length > 0 ? notInArray(listing.category, except.categories) : undefined,
        page.after ? place(page.after) : undefined,
      ),
    )
    .orderBy(desc(listingVersion.risk), asc(listingVersion.submittedAt), asc(listingVersion.id))
    .limit(page.limit)
  return rows.map((row) => ({ ...row, body: row.body as ListingBody }))
}

/** Categories in which this member sells: a moderator decides on no competitor. */
export async function listOwnCategories(memberId: string, tx: Tx = db()): Promise<string[]> {
  const rows = await tx
    .select({ category: listing.category, listings: count() })
    .from(listing)
    .innerJoin(seller, eq(seller.id, listing.sellerId))
    .where(and(eq(seller.memberId, memberId), ne(listing.state, 'draft')))
    .groupBy(listing.category)
  return rows.map((row) => row.category)
}
