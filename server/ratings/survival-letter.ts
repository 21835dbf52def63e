import type { Letter } from '@/server/mail/letter'
import { orderTag, orderUrl, type LetterFacts } from '@/server/orders/letters/letter-facts'
import { printCount } from '@/shared/units/count'

/** The question of day 7, to the buyer alone. A reminder like the others: who takes none finds it among the notices. */
export function survivalLetter(facts: LetterFacts, handedOver: number) {
  return {
    to: facts.buyer,
    subject: `How many of your ${printCount(handedOver)} are alive?`,
    heading: 'Seven days on: one number, please',
    blocks: [
      orderTag(facts),
      {
        kind: 'text',
        text: `${facts.seller.farmName} handed over ${printCount(handedOver)} a week ago. Count roughly if you cannot count exactly. None is an honest answer too.`,
      },
      { kind: 'button', label: 'Say how many', url: orderUrl(facts) },
      {
        kind: 'text',
        text: 'All answers are added up on the seller’s page, good and bad. This is the only time we ask.',
      },
    ],
    optional: { list: 'reminders', memberId: facts.buyer.memberId },
  } satisfies Letter
}
