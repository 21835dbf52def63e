import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { newPublicId } from '@/server/new-public-id'
import { orderSeenBy, type OrderSeen } from '@/server/orders/party-of'
import { presentRating } from '@/server/ratings/present-rating'
import { mayRate } from '@/server/ratings/rating-policy'
import {
  insertRating,
  lockRatingOf,
  lockSeller,
  setRating,
  type RatingRow,
} from '@/server/ratings/rating-store'
import { ratedLetter } from '@/server/ratings/rating-letters'
import { recountSeller } from '@/server/ratings/recount-seller'
import { tellParty } from '@/server/ratings/tell-party'
import type { ParsedBody } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownRating } from '@/shared/contracts/ratings'

type Asked = ParsedBody<Endpoints['rateOrder']>

const columnsOf = ({ marks, words }: Asked) => ({
  fishMark: marks.fish,
  countMark: marks.count,
  contactMark: marks.contact,
  words,
})

/** The seller's row first, then the rating's: two ratings of one seller wait for each other and count each other. */
async function asBuyer(
  caller: Caller,
  orderId: string,
  write: (tx: Tx, seen: OrderSeen, before: RatingRow | undefined) => Promise<void>,
): Promise<ShownRating> {
  const seen = await orderSeenBy(caller, orderId)
  if (seen.party !== 'buyer') throw new Problem('not-found')
  const after = await inTransaction(async (tx) => {
    await lockSeller(tx, seen.order.sellerId)
    await write(tx, seen, await lockRatingOf(tx, seen.order.id))
    await recountSeller(tx, seen.order.sellerId)
    return lockRatingOf(tx, seen.order.id)
  })
  if (!after) throw new Problem('not-found')
  return presentRating(after, caller.name)
}

/** The buyer's one rating of an order that was handed over. */
export async function rateOrder(caller: Caller, orderId: string, asked: Asked): Promise<ShownRating> {
  return asBuyer(caller, orderId, async (tx, { order, party }, before) => {
    if (before)
      throw new Problem('rating-closed', 'You have rated this order already. You can change it for 14 days.')
    if (!mayRate('rate', { order, party }))
      throw new Problem('rating-closed', 'An order can be rated once it has been handed over.')
    await insertRating(tx, {
      ...columnsOf(asked),
      publicId: newPublicId(),
      orderId: order.id,
      sellerId: order.sellerId,
      buyerId: caller.memberId,
      createdAt: now(),
    })
    await tellParty(tx, { kind: 'rated', orderId: order.id }, ratedLetter)
  })
}

/** Words that a moderator hid stay hidden when they are changed: who hid them looks again. */
export async function changeRating(caller: Caller, orderId: string, asked: Asked): Promise<ShownRating> {
  return asBuyer(caller, orderId, async (tx, { order, party }, before) => {
    if (!before) throw new Problem('not-found')
    if (!mayRate('change-rating', { order, party, rating: before }))
      throw new Problem(
        'rating-closed',
        'The 14 days in which a rating can be changed are over. It stands as it is.',
      )
    await setRating(tx, before.id, { ...columnsOf(asked), editedAt: now() })
  })
}
