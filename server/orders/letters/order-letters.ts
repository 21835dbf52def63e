import { endings } from '@/server/orders/letters/ended-letters'
import { orderTag, slotText, type LetterFacts } from '@/server/orders/letters/letter-facts'
import { say, see, toBuyer, toSeller, untilClock, type Writer } from '@/server/orders/letters/letter-parts'
import { settled } from '@/server/orders/letters/settled-letters'
import { shipLetters } from '@/server/orders/letters/ship-letters'
import { daysRows } from '@/server/orders/letters/ship-words'
import { bringWords, careCautions, caution } from '@/server/orders/letters/care-words'
import { promiseWords } from '@/server/orders/promise-words'
import { countWords, thingsOf } from '@/shared/domain/listings/count-words'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'
import { printCents } from '@/shared/units/money'

const counted = ({ terms, order }: LetterFacts) => countWords(terms, order.quantity)
const things = ({ terms }: LetterFacts) => thingsOf(terms)

const charge = (facts: LetterFacts) => printCents(facts.order.firstChargeCents)

const whenRows = (facts: LetterFacts): [string, string][] =>
  facts.shipment ? daysRows(facts.shipment, facts.order) : [['Pickup', slotText(facts)]]

const requested: Writer = (facts) => [
  toSeller(facts, {
    subject: `${counted(facts)} asked for: please answer`,
    heading: `${facts.buyer.name} asks for ${counted(facts)}`,
    blocks: [
      orderTag(facts),
      {
        kind: 'facts',
        rows: [...whenRows(facts), ['Answer until', untilClock(facts)]],
      },
      say(
        'The deposit is earmarked on the buyer’s card. Accept and it is taken; without an answer it is let go.',
      ),
      see(facts, 'Answer the request'),
    ],
  }),
  toBuyer(facts, {
    subject: 'Your request is with the seller',
    heading: `${facts.seller.farmName} has your request`,
    blocks: [
      orderTag(facts),
      {
        kind: 'facts',
        rows: [['Earmarked, not taken', charge(facts)], ...whenRows(facts), ['Answer by', untilClock(facts)]],
      },
      say('If the seller declines or stays silent, nothing is taken and your card is free again.'),
      see(facts, 'See your order'),
    ],
  }),
]

const accepted: Writer = (facts) => [
  toBuyer(facts, {
    subject: `Your ${things(facts)} are set aside`,
    heading: 'Accepted: choose a day next',
    blocks: [
      orderTag(facts),
      { kind: 'facts', rows: [['Paid', charge(facts)]] },
      see(facts, 'See your order'),
    ],
  }),
]

const isMoved = ({ agreement }: LetterFacts) => agreement !== null && agreement.sequence > 0

const scheduled: Writer = (facts) => [
  toBuyer(facts, {
    subject: `${isMoved(facts) ? 'Moved: pickup' : 'Pickup'} ${slotText(facts)}`,
    heading: isMoved(facts) ? 'The day has moved' : 'It is a date',
    blocks: [
      orderTag(facts),
      {
        kind: 'facts',
        rows: [
          ['When', slotText(facts)],
          [
            'Where',
            `${facts.seller.street}, ${facts.seller.city}, ${facts.seller.state} ${facts.seller.zip}`,
          ],
          ['Phone', facts.seller.phone],
          ['Paid', charge(facts)],
          ['Still to pay', printCents(facts.order.balanceCents)],
        ],
      },
      say(bringWords(facts.terms)),
      ...(facts.terms.category === 'produce' ? [caution(fillCaution('G-9', {}))] : []),
      caution(fillCaution('G-12', {})),
      see(facts, 'Open the pickup sheet'),
    ],
  }),
  toSeller(facts, {
    subject: `${isMoved(facts) ? 'Moved: pickup' : 'Pickup'} ${slotText(facts)}: ${counted(facts)}`,
    heading: `${facts.buyer.name} comes ${slotText(facts)}`,
    blocks: [
      orderTag(facts),
      say(`Mark the order ready when the ${things(facts)} are counted and waiting.`),
      see(facts, 'See the order'),
    ],
  }),
]

const ready: Writer = (facts) => [
  toBuyer(facts, {
    subject: 'Ready for pickup',
    heading: `Your ${things(facts)} are ready`,
    blocks: [
      orderTag(facts),
      {
        kind: 'facts',
        rows: [
          ['When', slotText(facts)],
          ['Still to pay', facts.order.balancePaidAt ? printCents(0) : printCents(facts.order.balanceCents)],
        ],
      },
      say('Pay the rest on your phone before you count together. Then your code appears: give it last.'),
      see(facts, 'Open the order'),
    ],
  }),
]

const handedOver: Writer = (facts) => [
  toBuyer(facts, {
    subject: things(facts) === 'goods' ? 'Handed over' : 'Handed over: look after them now',
    heading: `${countWords(facts.terms, facts.order.countHandedOver ?? facts.order.quantity)}: yours now`,
    blocks: [
      orderTag(facts),
      say(promiseWords(facts.terms)),
      { kind: 'facts', rows: [['Your money is held until', untilClock(facts)]] },
      ...careCautions(facts.terms),
      see(facts, 'All good, or report a loss'),
    ],
  }),
  toSeller(facts, {
    subject: 'Handed over',
    heading: `${facts.buyer.name} has the ${things(facts)}`,
    blocks: [
      orderTag(facts),
      { kind: 'facts', rows: [['The money is released', untilClock(facts)]] },
      see(facts, 'See the order'),
    ],
  }),
]

const withdrawn: Writer = (facts) => [
  toSeller(facts, {
    subject: 'A request was taken back',
    heading: `${facts.buyer.name} took the request back`,
    blocks: [orderTag(facts), say(`The ${things(facts)} are free again. There is nothing for you to do.`)],
  }),
]

/** The mails of each edge; an edge without a row sends none, or (E15, E24, E56) once its money is decided. */
const orderLetters: Partial<Record<EdgeId, Writer>> = {
  E02: endings.holdOver,
  E04: requested,
  E05: accepted,
  E07: accepted,
  E08: endings.declined,
  E09: endings.silent,
  E10: withdrawn,
  E14: scheduled,
  E16: endings.sellerCancelled,
  E17: endings.neverScheduled,
  E20: endings.holdDeclined,
  E21: endings.holdNoConsent,
  E22: ready,
  E23: (facts) => (facts.order.isDayBySilence ? endings.silentDayUnpaid : endings.balanceUnpaid)(facts),
  E25: endings.sellerCancelled,
  E26: endings.dayMissed,
  E28: scheduled,
  E30: handedOver,
  E31: endings.buyerAbsent,
  E32: endings.sellerAbsent,
  E33: endings.unclear,
  E38: settled,
  E40: settled,
  E41: endings.decided,
  E43: endings.stopped,
  E45: endings.stopped,
  E46: endings.stopped,
  E47: endings.stopped,
  E48: endings.stopped,
  E54: endings.sellerCancelled,
  E55: endings.sellerCancelled,
}

/** The writer of an edge's mails: of a shipped order its own where there is one. */
export function writerOf(edge: EdgeId, handOver: string): Writer | undefined {
  return (handOver === 'ship' ? shipLetters[edge] : undefined) ?? orderLetters[edge]
}
