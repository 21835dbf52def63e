import { endings } from '@/server/orders/letters/ended-letters'
import { orderTag, type LetterFacts, type OrderLetter } from '@/server/orders/letters/letter-facts'
import { say, see, toBuyer, toSeller, untilClock, type Writer } from '@/server/orders/letters/letter-parts'
import { settled } from '@/server/orders/letters/settled-letters'
import { arrivesWords, boxWords, daysRows, leavesWords, waitWords } from '@/server/orders/letters/ship-words'
import { promiseWords } from '@/server/orders/promise-words'
import type { ShipmentRow } from '@/server/orders/shipment-store'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import type { EdgeId } from '@/shared/domain/orders/edges.facts'
import { printCents } from '@/shared/units/money'

interface ShippedFacts extends LetterFacts {
  shipment: ShipmentRow
}

/** A writer that may count on the shipment's row: every shipped order has one. */
const shipped =
  (write: (facts: ShippedFacts) => OrderLetter[]): Writer =>
  (facts) =>
    facts.shipment ? write({ ...facts, shipment: facts.shipment }) : []

const caution = (text: string) => ({ kind: 'caution' as const, text })
const isMoved = ({ agreement }: LetterFacts) => agreement !== null && agreement.sequence > 0

const scheduled = shipped((facts) => {
  const { order, shipment, terms } = facts
  const leaves = leavesWords(order)
  const rest = order.balancePaidAt === null ? order.balanceCents : 0
  const rows = daysRows(shipment, order)
  const subject = isMoved(facts) ? `Moved: the box leaves ${leaves}` : `The box leaves ${leaves}`
  return [
    toBuyer(facts, {
      subject,
      heading: isMoved(facts) ? 'The day has moved' : 'It is a date',
      blocks: [
        orderTag(facts),
        { kind: 'facts', rows: [...rows, ['Still to pay', printCents(rest)]] },
        ...(rest > 0 ? [say(`Please pay the rest before ${untilClock(facts)}: a box leaves paid.`)] : []),
        say(
          'The seller looks at the weather on the way before packing. If it is too cold or too hot for them, the day moves.',
        ),
        see(facts, 'See your order'),
      ],
    }),
    toSeller(facts, {
      subject: `${subject}: ${order.quantity} animals`,
      heading: `For ${facts.buyer.name}, ${boxWords(shipment.boxes)}`,
      blocks: [
        orderTag(facts),
        { kind: 'facts', rows },
        say(
          terms.category === 'fish'
            ? 'Keep the animals without food for a day or two before, and mark the order ready when they are counted.'
            : 'Mark the order ready when the animals are counted.',
        ),
        see(facts, 'Packing sheet and labels'),
      ],
    }),
  ]
})

const ready = shipped((facts) => [
  toBuyer(facts, {
    subject: 'Your animals are counted and waiting for their day',
    heading: 'Ready to travel',
    blocks: [
      orderTag(facts),
      { kind: 'facts', rows: daysRows(facts.shipment, facts.order) },
      say(waitWords(facts.shipment.deliverTo)),
      see(facts, 'See your order'),
    ],
  }),
])

const dispatched = shipped((facts) => {
  const { shipment } = facts
  return [
    toBuyer(facts, {
      subject: `On their way: arriving ${arrivesWords(shipment)}`,
      heading: 'Your animals are on their way',
      blocks: [
        orderTag(facts),
        {
          kind: 'facts',
          rows: [
            ['Arrives', arrivesWords(shipment)],
            ['Carrier', shipment.carrier],
            ['Tracking number', shipment.tracking ?? ''],
            ['Boxes', boxWords(shipment.boxes)],
          ],
        },
        say(waitWords(shipment.deliverTo)),
        say(
          'When it is there: take a picture of the closed bags, say in the order that it came, then unpack.',
        ),
        caution(fillCaution('G-8', { hours: '6' })),
        caution(fillCaution('G-7', {})),
        caution(fillCaution('G-1', {})),
        see(facts, 'It has arrived'),
      ],
    }),
    toSeller(facts, {
      subject: 'The box is on its way',
      heading: `Due at ${facts.buyer.name}’s on ${arrivesWords(shipment)}`,
      blocks: [
        orderTag(facts),
        say('The money stays held until the animals have arrived and the time to report a loss is over.'),
        see(facts, 'See the order'),
      ],
    }),
  ]
})

const arrived = shipped((facts) => [
  toBuyer(facts, {
    subject: 'They have arrived: look after them now',
    heading: `${facts.order.quantity} animals are yours`,
    blocks: [
      orderTag(facts),
      say(promiseWords(facts.terms)),
      { kind: 'facts', rows: [['Your money is held until', untilClock(facts)]] },
      caution(fillCaution('G-8', { hours: '6' })),
      caution(fillCaution('G-7', {})),
      caution(fillCaution('G-1', {})),
      see(facts, 'All good, or report a loss'),
    ],
  }),
  toSeller(facts, {
    subject: 'The box has arrived',
    heading: `${facts.buyer.name} has the animals`,
    blocks: [
      orderTag(facts),
      { kind: 'facts', rows: [['The money is released', untilClock(facts)]] },
      see(facts, 'See the order'),
    ],
  }),
])

const late = shipped((facts) => {
  const { carrier, tracking } = facts.shipment
  const rows: [string, string][] = [
    ['Promised', arrivesWords(facts.shipment)],
    ['Carrier', carrier],
    ['Tracking number', tracking ?? ''],
  ]
  const ask = 'Please ask at the carrier’s counter with the tracking number: late boxes often stand there.'
  return [
    toBuyer(facts, {
      subject: 'Your box is late: what to do now',
      heading: 'We are sorry: the box is late',
      blocks: [
        orderTag(facts),
        { kind: 'facts', rows },
        say(ask),
        say(
          'If it turns up, keep it closed, cool and shaded until you can unpack, then say in the order how many are alive.',
        ),
        say('Your money stays held. A moderator decides by the arrival promise within about five days.'),
        see(facts, 'Say what happened'),
      ],
    }),
    toSeller(facts, {
      subject: 'A box of yours is late: what to do now',
      heading: `${facts.buyer.name} still waits`,
      blocks: [
        orderTag(facts),
        { kind: 'facts', rows },
        say(`${ask} You sent it, so they may tell you more than the buyer.`),
        say(
          'It does not count in your record. The money stays held until the buyer or a moderator has answered.',
        ),
        see(facts, 'See the order'),
      ],
    }),
  ]
})

/** A box that came with all alive ends like any other; else a moderator has said what goes where. */
const decided: Writer = (facts) =>
  (facts.shipment?.aliveCount ?? -1) >= facts.order.quantity ? settled(facts) : endings.lateDecided(facts)

/** The mails of a shipped order where they say something else than those of a pickup. */
export const shipLetters: Partial<Record<EdgeId, Writer>> = {
  E14: scheduled,
  E22: ready,
  E28: scheduled,
  E29: dispatched,
  E34: endings.neverSent,
  E35: arrived,
  E36: late,
  E41: decided,
}
