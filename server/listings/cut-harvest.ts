import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { changeFree } from '@/server/listings/batch-stock-store'
import { lockListing } from '@/server/listings/listing-store'
import { readOwnListing } from '@/server/listings/read-own-listing'
import { requireOwnListing } from '@/server/listings/require-own-listing'
import { cutOrder, type CutOrder } from '@/server/orders/cut-order'
import { lockOrdersToServe } from '@/server/orders/order-store'
import { projectListings } from '@/server/search/project-listings'
import type { ParsedBody, ReplyOf } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'
import type { cutHarvest as cutHarvestCall } from '@/shared/contracts/listings'

type Asked = ParsedBody<typeof cutHarvestCall> & { commandId: string }

interface Cut {
  cut: CutOrder[]
  unsold: number
}

/** What nobody has bought goes first, then the orders made last. */
async function cut(tx: Tx, listingId: number, asked: Asked & { by: string }): Promise<Cut> {
  const { count, note, commandId, by } = asked
  const row = await lockListing(listingId, tx)
  if (!row) throw new Problem('not-found')
  const there = row.free + row.held + row.pledged + row.sold
  if (count > there) {
    const detail = `Only ${there} are sold or offered here. Are there more? Then correct the count instead.`
    throw new Problem('fields-invalid', undefined, { errors: [{ detail, pointer: '#/count' }] })
  }
  const unsold = Math.min(row.free, there - count)
  if (unsold > 0) {
    const gone = { listingId, change: -unsold, reason: 'short-harvest', by, commandId, at: now() }
    await changeFree({ ...gone, ...(note ? { note } : {}) }, tx)
  }
  const done: CutOrder[] = []
  let short = there - count - unsold
  for (const order of short > 0 ? await lockOrdersToServe(tx, listingId) : []) {
    if (short === 0) break
    const one = await cutOrder(tx, order, { short, by, note, commandId })
    short -= one.units
    done.push(one)
  }
  await projectListings(tx, [listingId])
  return { cut: done, unsold }
}

/**
 * The seller says how many there really are. Entering the same count twice changes nothing the second time, as it is
 * compared with what is promised now.
 */
export async function cutHarvest(
  caller: Caller,
  publicId: string,
  asked: Asked,
): Promise<ReplyOf<typeof cutHarvestCall>> {
  const { listing } = await requireOwnListing(caller, publicId)
  if (listing.category === 'fish') {
    throw new Problem(
      'listing-closed',
      'Animals are not cut from orders by themselves: write to each buyer, and cancel or hand over fewer.',
    )
  }
  const done = await inTransaction((tx) => cut(tx, listing.id, { ...asked, by: caller.memberId }))
  return {
    listing: await readOwnListing(caller, publicId),
    cut: done.cut.map(({ order, units, left, refundCents }) => ({
      ...{ orderId: order.publicId, units, left, refundCents },
    })),
    unsold: done.unsold,
  }
}
