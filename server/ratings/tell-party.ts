import type { Tx } from '@/db/transaction'
import { describeListing } from '@/server/listings/describe-listing'
import type { Letter } from '@/server/mail/letter'
import { tellMember } from '@/server/notices/tell-member'
import type { LetterFacts, Person } from '@/server/orders/letters/letter-facts'
import { loadLetterFacts } from '@/server/orders/letters/load-letter-facts'
import { readOrderById } from '@/server/orders/order-store'
import type { NoticeKind } from '@/shared/contracts/notices'

type AfterKind = Extract<NoticeKind, 'day-seven' | 'rated' | 'rating-reply'>

/** Tells one party of what follows a hand-over, once an order and kind. Nothing when a party has left. */
export async function tellParty(
  tx: Tx,
  { kind, orderId }: { kind: AfterKind; orderId: number },
  write: (facts: LetterFacts) => Letter & { to: Person },
): Promise<void> {
  const order = await readOrderById(orderId, tx)
  const facts = order ? await loadLetterFacts(tx, order) : null
  if (!facts) return
  const letter = write(facts)
  const { title } = describeListing(facts.terms)
  const { memberId } = letter.to
  await tellMember(tx, { memberId, kind, cause: `${kind}:${orderId}`, about: { orderId }, title, letter })
}
