import { eq, sql } from 'drizzle-orm'

import type { Tx } from '@/db/client'
import { listing, stockMovement } from '@/db/schema/listings'
import type { StockPlace, StockShift } from '@/shared/domain/orders/edges.facts'

export interface StockMove {
  listingId: number
  orderId: number
  /** The edge, or the seller's word. */
  reason: string
  quantity: number
  moves: readonly StockShift[]
  by: string | null
  at: Date
}

/** Moves animals between the columns of a batch and writes the ledger row of it; CHECK refuses a negative column. */
export async function moveStock(tx: Tx, move: StockMove): Promise<void> {
  if (move.moves.length === 0 || move.quantity === 0) return
  const deltas = Object.fromEntries(move.moves.map(([place, sign]) => [place, sign * move.quantity]))
  const set = Object.fromEntries(
    Object.entries(deltas).map(([place, delta]) => [place, sql`${listing[place as StockPlace]} + ${delta}`]),
  )
  await tx.update(listing).set(set).where(eq(listing.id, move.listingId))
  await noteStock(tx, move, deltas)
}

/** Only the ledger row: for E01, whose conditional update has already moved the animals. */
export async function noteStock(
  tx: Tx,
  move: Omit<StockMove, 'moves'>,
  deltas: Partial<Record<StockPlace, number>>,
): Promise<void> {
  const { listingId, orderId, reason, by, at } = move
  await tx.insert(stockMovement).values({ listingId, orderId, reason, by, at, ...deltas })
}
