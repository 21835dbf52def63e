import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { orderSeenBy } from '@/server/orders/party-of'
import { readPeople } from '@/server/orders/party-store'
import { presentRating } from '@/server/ratings/present-rating'
import { repliedLetter } from '@/server/ratings/rating-letters'
import { mayRate } from '@/server/ratings/rating-policy'
import { lockRatingOf, setRating } from '@/server/ratings/rating-store'
import { tellParty } from '@/server/ratings/tell-party'
import { Problem } from '@/shared/api/problem'
import type { ShownRating } from '@/shared/contracts/ratings'

/** The seller's one reply, for everybody to read under the rating. */
export async function replyToRating(caller: Caller, orderId: string, reply: string): Promise<ShownRating> {
  const { order, party } = await orderSeenBy(caller, orderId)
  if (party !== 'seller') throw new Problem('not-found')
  const replied = await inTransaction(async (tx) => {
    const rating = await lockRatingOf(tx, order.id)
    if (!rating) throw new Problem('not-found')
    if (!mayRate('reply-to-rating', { order, party, rating }))
      throw new Problem('rating-closed', 'You have replied to this rating. One reply stands for good.')
    const change = { reply, repliedAt: now() }
    await setRating(tx, rating.id, change)
    await tellParty(tx, { kind: 'rating-reply', orderId: order.id }, repliedLetter)
    return { ...rating, ...change }
  })
  const people = await readPeople([replied.buyerId])
  return presentRating(replied, people.get(replied.buyerId)?.name)
}
