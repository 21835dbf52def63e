import { orderTag } from '@/server/orders/letters/letter-facts'
import { see, toBuyer, toSeller, type Writer } from '@/server/orders/letters/letter-parts'
import { printCents } from '@/shared/units/money'

/** The receipt, and the news that the money is on its way. */
export const settled: Writer = (facts) => {
  const { order } = facts
  const kept = order.firstChargeCents + (order.balancePaidAt ? order.balanceCents : 0) - order.refundedCents
  return [
    toBuyer(facts, {
      subject: 'Receipt: your order is complete',
      heading: 'All done',
      blocks: [
        orderTag(facts),
        {
          kind: 'facts',
          rows: [
            ['Paid in all', printCents(kept)],
            ['Refunded', printCents(order.refundedCents)],
          ],
        },
        see(facts, 'See the receipt'),
      ],
    }),
    toSeller(facts, {
      subject: 'Your money is on its way',
      heading: `${printCents(kept - order.feeCents - order.taxCents)} released`,
      blocks: [
        orderTag(facts),
        {
          kind: 'facts',
          rows: [
            ['Paid by the buyer', printCents(kept)],
            ['Our fee', printCents(order.feeCents)],
          ],
        },
        see(facts, 'See the order'),
      ],
    }),
  ]
}
