import type { Tx } from '@/db/transaction'
import { describeListing } from '@/server/listings/describe-listing'
import { tellMember } from '@/server/notices/tell-member'
import { dayFollows } from '@/server/orders/day-follows'
import { loadLetterFacts } from '@/server/orders/letters/load-letter-facts'
import type { LetterFacts, OrderLetter } from '@/server/orders/letters/letter-facts'
import { writerOf } from '@/server/orders/letters/order-letters'
import { noticeKindOf } from '@/server/orders/notice-kinds'
import { orderCalendar } from '@/server/orders/order-calendar'
import type { OrderRow } from '@/server/orders/order-store'
import { edges, type EdgeId } from '@/shared/domain/orders/edges.facts'

const DATE_FOLLOWS = new Set<EdgeId>(['E05', 'E07'])
/** Agreed, moved or off: what a calendar has to know. */
const CHANGES_CALENDAR = new Set(['scheduled', 'weather_hold', 'cancelled'])

/**
 * Queues mails and notices of an edge with the change itself. Where the date follows in the same breath, one says both.
 */
export async function queueOrderLetters(tx: Tx, edge: EdgeId, order: OrderRow): Promise<void> {
  const write = writerOf(edge, order.handOver)
  if (!write || (DATE_FOLLOWS.has(edge) && dayFollows(order))) return
  await queueLettersOf(tx, { edge, order, write })
}

interface Told {
  edge: EdgeId
  order: OrderRow
  write: (facts: LetterFacts) => OrderLetter[]
}

/** The same for letters that need more than the order itself to be written. */
export async function queueLettersOf(tx: Tx, { edge, order, write }: Told): Promise<void> {
  const facts = await loadLetterFacts(tx, order)
  if (!facts) return
  const { title } = describeListing(facts.terms)
  for (const letter of write(facts)) {
    const { memberId } = letter.to
    const party = memberId === order.buyerId ? 'buyer' : 'seller'
    const calendar = CHANGES_CALENDAR.has(edges[edge].to) ? orderCalendar(facts, party) : null
    await tellMember(tx, {
      memberId,
      kind: noticeKindOf(edge),
      cause: `order:${order.id}:v${order.version}`,
      about: { orderId: order.id },
      title,
      letter: calendar ? { ...letter, calendar } : letter,
    })
  }
}
