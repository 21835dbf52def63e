import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { writeAudit } from '@/server/moderation/audit-store'
import { readPeople, readSellerById } from '@/server/orders/party-store'
import { presentRating } from '@/server/ratings/present-rating'
import { findRating, lockRatingOf, setRating } from '@/server/ratings/rating-store'
import type { ParsedBody } from '@/shared/api/endpoint'
import { Problem } from '@/shared/api/problem'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownRating } from '@/shared/contracts/ratings'

type Asked = ParsedBody<Endpoints['hideRatingWords']>

/** Hides words, never marks. Nobody does it in a matter of their own; every time is in the audit log. */
export async function hideRatingWords(caller: Caller, ratingId: string, asked: Asked): Promise<ShownRating> {
  const found = await findRating(ratingId)
  if (!found) throw new Problem('not-found')
  const seller = await readSellerById(found.sellerId)
  if (caller.memberId === found.buyerId || caller.memberId === seller?.memberId)
    throw new Problem('not-allowed', 'This rating concerns you: another moderator looks at it.')
  const hidden = await inTransaction(async (tx) => {
    const rating = await lockRatingOf(tx, found.orderId)
    const said = asked.part === 'words' ? rating?.words : rating?.reply
    if (!rating || !said) throw new Problem('not-found', 'There are no words to hide.')
    const change = asked.part === 'words' ? { wordsHidden: asked.reason } : { replyHidden: asked.reason }
    await setRating(tx, rating.id, change)
    await writeAudit(
      {
        actorId: caller.memberId,
        act: 'rating-words-hidden',
        subject: `rating:${rating.id}`,
        facts: { ...asked, said },
        at: now(),
      },
      tx,
    )
    return { ...rating, ...change }
  })
  const people = await readPeople([hidden.buyerId])
  return presentRating(hidden, people.get(hidden.buyerId)?.name)
}
