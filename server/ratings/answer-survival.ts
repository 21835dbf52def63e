import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { orderSeenBy } from '@/server/orders/party-of'
import { presentSurvival } from '@/server/ratings/present-rating'
import { mayRate } from '@/server/ratings/rating-policy'
import { lockSeller } from '@/server/ratings/rating-store'
import { lockSurvivalOf, recountSurvival, setSurvival } from '@/server/ratings/survival-store'
import { Problem } from '@/shared/api/problem'
import type { ShownSurvival } from '@/shared/contracts/ratings'

/** How many are alive on day 7: answered once, corrected for a week. A correction keeps the day of the answer. */
export async function answerSurvival(caller: Caller, orderId: string, alive: number): Promise<ShownSurvival> {
  const { order, party } = await orderSeenBy(caller, orderId)
  if (party !== 'buyer') throw new Problem('not-found')
  return inTransaction(async (tx) => {
    await lockSeller(tx, order.sellerId)
    const survival = await lockSurvivalOf(tx, order.id)
    if (!survival || !mayRate('answer-survival', { order, party, survival })) {
      throw new Problem(
        'rating-closed',
        'We ask on the seventh day after the hand-over. The answer stays open for 14 days, a correction for 7.',
      )
    }
    if (alive > survival.handedOver) {
      const detail = `${survival.handedOver} were handed over: no more than that can be alive.`
      throw new Problem('fields-invalid', detail, { errors: [{ pointer: '#/alive', detail }] })
    }
    const at = now()
    // Who answers before the runner has asked needs no mail any more, and counts as asked.
    const first = { alive, answeredAt: at, askedAt: survival.askedAt ?? at }
    const change = survival.answeredAt ? { alive, correctedAt: at } : first
    await setSurvival(tx, order.id, change)
    await recountSurvival(tx, order.sellerId)
    return presentSurvival({ ...survival, ...change })
  })
}
