import type { Tx } from '@/db/transaction'
import { newPublicId } from '@/server/new-public-id'
import { planWindows } from '@/server/listings/plan-windows'
import { resolveWindows } from '@/server/listings/resolve-windows'
import { insertWindows, lockWindows, setWindow } from '@/server/listings/window-store'
import { Problem } from '@/shared/api/problem'
import type { ListingBody } from '@/shared/contracts/listings'

export interface WindowsWanted {
  listingId: number
  body: ListingBody
  zone: string
  at: Date
}

/**
 * Refuses what buyers' places forbid; nothing is changed. For what the seller submits now but a moderator sees first.
 */
export async function checkWindows({ listingId, body, zone, at }: WindowsWanted, tx: Tx): Promise<void> {
  const { windows, errors } = resolveWindows(body.windows, { zone, at })
  const { problems } = planWindows(await lockWindows(listingId, tx), windows, at)
  const all = [...errors, ...problems.map((detail) => ({ detail, pointer: '#/draft/windows' }))]
  if (all.length > 0) throw new Problem('listing-incomplete', undefined, { errors: all })
}

/** Brings the windows in step with the version that is published; what buyers hold is kept in any case. */
export async function applyWindows({ listingId, body, zone, at }: WindowsWanted, tx: Tx): Promise<void> {
  const { placeKind } = body
  const plan = planWindows(
    await lockWindows(listingId, tx),
    resolveWindows(body.windows, { zone, at }).windows,
    at,
  )
  const added = plan.add.map((window) => ({ publicId: newPublicId(), listingId, ...window, zone, placeKind }))
  await insertWindows(added, tx)
  for (const { id, capacity } of plan.change)
    await setWindow(id, { capacity, placeKind, zone, closed: 0 }, tx)
  for (const id of plan.close) await setWindow(id, { closed: 1 }, tx)
}
