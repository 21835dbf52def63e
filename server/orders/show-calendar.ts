import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { loadLetterFacts } from '@/server/orders/letters/load-letter-facts'
import { orderCalendar } from '@/server/orders/order-calendar'
import { orderSeenBy } from '@/server/orders/party-of'
import { Problem } from '@/shared/api/problem'

/** The calendar file of an order, for its two parties. Before a time is agreed there is none: a 404, as for others. */
export async function showCalendar(caller: Caller, orderId: string) {
  const { order, party } = await orderSeenBy(caller, orderId)
  if (party === 'staff') throw new Problem('not-found')
  const facts = await inTransaction((tx) => loadLetterFacts(tx, order))
  const file = facts && orderCalendar(facts, party)
  if (!file) throw new Problem('not-found')
  return file
}
