import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { lockSeller } from '@/server/ratings/rating-store'
import { survivalLetter } from '@/server/ratings/survival-letter'
import {
  listDueSurvival,
  markAsked,
  recountSurvival,
  type SurvivalRow,
} from '@/server/ratings/survival-store'
import { tellParty } from '@/server/ratings/tell-party'
import { ratingTimes } from '@/shared/domain/ratings/rating-times.facts'

const MOST_AT_A_TIME = 100

/** Marks the question asked and queues its notice and mail in one transaction: never twice, and never lost. */
async function ask({ orderId, sellerId, handedOver }: SurvivalRow): Promise<void> {
  await inTransaction(async (tx) => {
    await lockSeller(tx, sellerId)
    if (!(await markAsked(tx, orderId, now()))) return
    await recountSurvival(tx, sellerId)
    await tellParty(tx, { kind: 'day-seven', orderId }, (facts) => survivalLetter(facts, handedOver))
  })
}

/** Asks the buyers whose day 7 has come, while an answer can still be given. Returns how many there were. */
export async function askSurvival(): Promise<number> {
  const at = now()
  const from = new Date(at.getTime() - ratingTimes.survivalOpenMs)
  const due = await listDueSurvival({ from, at }, MOST_AT_A_TIME)
  for (const row of due) await ask(row)
  return due.length
}
