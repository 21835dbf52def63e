import type { Tx } from '@/db/transaction'
import { queueMail } from '@/server/mail/queue-mail'
import { loadLetterFacts } from '@/server/orders/letters/load-letter-facts'
import { orderLetters } from '@/server/orders/letters/order-letters'
import type { OrderRow } from '@/server/orders/order-store'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'

const DATE_FOLLOWS = new Set<EdgeId>(['E05', 'E07'])

/** Queues the mails of an edge with the change itself. Where the date follows in the same breath, one mail says both. */
export async function queueOrderLetters(tx: Tx, edge: EdgeId, order: OrderRow): Promise<void> {
  const write = orderLetters[edge]
  if (!write || (DATE_FOLLOWS.has(edge) && order.windowId !== null)) return
  const facts = await loadLetterFacts(tx, order)
  if (!facts) return
  for (const letter of write(facts)) await queueMail(letter, tx)
}
