import type { Tx } from '@/db/transaction'
import { describeListing } from '@/server/listings/describe-listing'
import { tellMember } from '@/server/notices/tell-member'
import { loadLetterFacts } from '@/server/orders/letters/load-letter-facts'
import { orderTag, orderUrl } from '@/server/orders/letters/letter-facts'
import type { OrderRow } from '@/server/orders/order-store'
import { printMoment } from '@/shared/times/print-time'

/** Tells the one said to be absent, with the time they have to object. */
export async function queueNoShowLetter(tx: Tx, order: OrderRow): Promise<void> {
  const facts = await loadLetterFacts(tx, order)
  if (!facts) return
  const isBySeller = order.noShowBy === 'seller'
  const until = order.clockAt ? printMoment(order.clockAt.toISOString(), order.zone) : 'tomorrow'
  const to = isBySeller ? facts.buyer : facts.sellerPerson
  await tellMember(tx, {
    memberId: to.memberId,
    kind: 'no-show',
    cause: `no-show:${order.id}:${order.noShowAt?.getTime() ?? 0}`,
    about: { orderId: order.id },
    title: describeListing(facts.terms).title,
    letter: {
      to,
      subject: isBySeller ? 'The seller says you did not come' : 'The buyer says you were not there',
      heading: 'Was it so?',
      blocks: [
        orderTag(facts),
        {
          kind: 'text',
          text: `If it was otherwise, say so before ${until}: a moderator then looks at it. Without a word from you ${isBySeller ? 'the deposit is kept and the rest goes back' : 'everything goes back to the buyer'}.`,
        },
        { kind: 'button', label: 'Say what happened', url: orderUrl(facts) },
      ],
    },
  })
}
