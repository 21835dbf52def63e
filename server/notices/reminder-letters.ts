import type { Letter } from '@/server/mail/letter'
import type { ReminderKind } from '@/server/notices/reminder-moments'
import { bringWords } from '@/server/orders/letters/care-words'
import { orderTag, orderUrl, slotText, type LetterFacts } from '@/server/orders/letters/letter-facts'
import { countWords, thingsOf } from '@/shared/domain/listings/count-words'
import { printCents } from '@/shared/units/money'

const placeOf = ({ seller }: LetterFacts) => `${seller.street}, ${seller.city}, ${seller.state} ${seller.zip}`

const toPay = ({ order }: LetterFacts) => printCents(order.balancePaidAt === null ? order.balanceCents : 0)

const isPaid = ({ order }: LetterFacts) => order.balanceCents === 0 || order.balancePaidAt !== null

function toBuyer(facts: LetterFacts, kind: ReminderKind): Omit<Letter, 'to'> {
  const isTomorrow = kind === 'evening-before'
  return {
    subject: isTomorrow ? `Tomorrow: pickup at ${facts.seller.farmName}` : 'Your pickup is in two hours',
    heading: isTomorrow ? 'Your pickup is tomorrow' : 'In two hours',
    blocks: [
      orderTag(facts),
      {
        kind: 'facts',
        rows: [
          ['When', slotText(facts)],
          ['Where', placeOf(facts)],
          ['Phone', facts.seller.phone],
          ['Still to pay', toPay(facts)],
        ],
      },
      {
        kind: 'text',
        text: isTomorrow
          ? bringWords(facts.terms)
          : `${isPaid(facts) ? '' : 'Pay the rest on your phone at the gate. '}Your six-digit code stands on the order page once the animals are ready and paid: count together first and give it last.`,
      },
      { kind: 'button', label: 'Open the order', url: orderUrl(facts) },
    ],
  }
}

function toSeller(facts: LetterFacts, kind: ReminderKind): Omit<Letter, 'to'> {
  const { buyer, order } = facts
  const isTomorrow = kind === 'evening-before'
  const isReady = order.state === 'ready'
  return {
    subject: `${isTomorrow ? 'Tomorrow' : 'In two hours'}: ${countWords(facts.terms, order.quantity)} for ${buyer.name}`,
    heading: `${buyer.name} comes ${isTomorrow ? 'tomorrow' : 'in two hours'}`,
    blocks: [
      orderTag(facts),
      {
        kind: 'facts',
        rows: [
          ['When', slotText(facts)],
          ['Count', countWords(facts.terms, order.quantity)],
          ['The buyer still pays', toPay(facts)],
        ],
      },
      {
        kind: 'text',
        text: isReady
          ? 'Count together at the gate; the buyer gives the code last.'
          : `Mark the order ready when the ${thingsOf(facts.terms)} are counted and waiting.`,
      },
      { kind: 'button', label: 'See the order', url: orderUrl(facts) },
    ],
  }
}

/** The reminder of one party. It may be switched off, so it names its list. */
export function reminderLetter(facts: LetterFacts, kind: ReminderKind, party: 'buyer' | 'seller'): Letter {
  const to = party === 'buyer' ? facts.buyer : facts.sellerPerson
  const letter = party === 'buyer' ? toBuyer(facts, kind) : toSeller(facts, kind)
  return { to, ...letter, optional: { list: 'reminders', memberId: to.memberId } }
}
