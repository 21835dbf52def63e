import { and, eq, inArray } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { listingVersion } from '@/db/schema/listings'
import type { ListingBody } from '@/shared/contracts/listings'

/** The terms an order was made from: the body of its listing version. Versions are checked whole before they are kept. */
export async function readTerms(tx: Tx, versionId: number): Promise<ListingBody> {
  const [row] = await tx
    .select({ body: listingVersion.body })
    .from(listingVersion)
    .where(eq(listingVersion.id, versionId))
  if (!row) throw new Error(`listing version ${versionId} is gone`)
  return row.body as ListingBody
}

export async function readTermsOf(versionIds: number[]): Promise<Map<number, ListingBody>> {
  if (versionIds.length === 0) return new Map()
  const rows = await db()
    .select({ id: listingVersion.id, body: listingVersion.body })
    .from(listingVersion)
    .where(inArray(listingVersion.id, versionIds))
  return new Map(rows.map((row) => [row.id, row.body as ListingBody]))
}

export interface LiveTerms {
  versionId: number
  number: number
  terms: ListingBody
}

/** The version the public sees now. */
export async function readLiveTerms(listingId: number, number: number): Promise<LiveTerms> {
  const [row] = await db()
    .select({ id: listingVersion.id, number: listingVersion.number, body: listingVersion.body })
    .from(listingVersion)
    .where(and(eq(listingVersion.listingId, listingId), eq(listingVersion.number, number)))
  if (!row) throw new Error(`listing ${listingId} names version ${number}, which is gone`)
  return { versionId: row.id, number: row.number, terms: row.body as ListingBody }
}
