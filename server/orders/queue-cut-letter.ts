import type { Tx } from '@/db/transaction'
import { describeListing } from '@/server/listings/describe-listing'
import { tellMember } from '@/server/notices/tell-member'
import { freeCancelUntil } from '@/server/orders/free-cancel-until'
import { orderTag, orderUrl, slotText } from '@/server/orders/letters/letter-facts'
import { loadLetterFacts } from '@/server/orders/letters/load-letter-facts'
import type { OrderRow } from '@/server/orders/order-store'
import { countWords } from '@/shared/domain/listings/count-words'
import { printMoment } from '@/shared/times/print-time'
import { printCents } from '@/shared/units/money'

interface Cut {
  units: number
  refundCents: number
}

/** Tells the buyer before they leave home: how many are left, what goes back, and until when they may cancel for nothing. */
export async function queueCutLetter(tx: Tx, order: OrderRow, { units, refundCents }: Cut): Promise<void> {
  const facts = await loadLetterFacts(tx, order)
  if (!facts) return
  const { terms, seller } = facts
  const until = freeCancelUntil(order, terms)
  const back = refundCents > 0 ? [['Back to your card', printCents(refundCents)] as [string, string]] : []
  const rest = order.balancePaidAt === null ? order.balanceCents : 0
  await tellMember(tx, {
    memberId: facts.buyer.memberId,
    kind: 'quantity-cut',
    cause: `cut:${order.id}:${order.quantityCut}`,
    about: { orderId: order.id },
    title: describeListing(terms).title,
    letter: {
      to: facts.buyer,
      subject: `Fewer than you ordered: ${countWords(terms, order.quantity)}`,
      heading: 'There are fewer than you ordered',
      blocks: [
        orderTag(facts),
        {
          kind: 'text',
          text: `${seller.farmName} has ${countWords(terms, units)} less for you and is sorry. ${countWords(terms, order.quantity)} are still yours.`,
        },
        {
          kind: 'facts',
          rows: [
            ...back,
            ['Still to pay', printCents(rest)],
            ['When', slotText(facts)],
            [
              'Cancel for free',
              until ? `until ${printMoment(until.toISOString(), order.zone)}` : 'until a day is agreed',
            ],
          ],
        },
        { kind: 'button', label: 'See your order', url: orderUrl(facts) },
      ],
    },
  })
}
