import { and, eq, isNull, sql } from 'drizzle-orm'

import type { Tx } from '@/db/client'
import { listing, stockMovement } from '@/db/schema/listings'

export interface FreeChange {
  listingId: number
  change: number
  reason: string
  note?: string
  by: string
  commandId: string
  at: Date
}

/**
 * Changes the free count with its ledger row; false when fewer are free than would leave. One conditional UPDATE: a
 * buyer's hold in the same moment cannot be taken away.
 */
export async function changeFree(move: FreeChange, tx: Tx): Promise<boolean> {
  const { listingId, change, reason, note, by, commandId, at } = move
  const [done] = await tx
    .update(listing)
    .set({ free: sql`${listing.free} + ${change}`, updatedAt: at })
    .where(and(eq(listing.id, listingId), sql`${listing.free} + ${change} >= 0`))
  if (done.affectedRows !== 1) return false
  await tx
    .insert(stockMovement)
    .values({ listingId, reason, free: change, by, note: note ?? null, commandId, at })
  return true
}

export async function hasMoved(listingId: number, commandId: string, tx: Tx): Promise<boolean> {
  const found = await tx.$count(
    stockMovement,
    and(eq(stockMovement.listingId, listingId), eq(stockMovement.commandId, commandId)),
  )
  return found > 0
}

/** Whether the batch was ever put on sale: from then on its count moves only through the ledger. */
export async function hasStock(listingId: number, tx: Tx): Promise<boolean> {
  return (
    (await tx.$count(
      stockMovement,
      and(eq(stockMovement.listingId, listingId), isNull(stockMovement.orderId)),
    )) > 0
  )
}
