import type { Letter } from '@/server/mail/letter'
import { orderTag, orderUrl, type LetterFacts } from '@/server/orders/letters/letter-facts'
import { arrivesWords, boxWords, daysRows, waitWords } from '@/server/orders/letters/ship-words'
import type { ShipmentRow } from '@/server/orders/shipment-store'

type Shipped = LetterFacts & { shipment: ShipmentRow }

function toBuyer(facts: Shipped): Omit<Letter, 'to'> {
  const { shipment } = facts
  return {
    subject: `Tomorrow: your animals arrive${shipment.deliverTo === 'counter' ? ' at the counter' : ''}`,
    heading: 'They arrive tomorrow',
    blocks: [
      orderTag(facts),
      {
        kind: 'facts',
        rows: [
          ['Arrives', arrivesWords(shipment)],
          ['Carrier', shipment.carrier],
          ['Tracking number', shipment.tracking ?? ''],
        ],
      },
      { kind: 'text', text: waitWords(shipment.deliverTo) },
      { kind: 'text', text: 'Have your tank running tonight, and a clock at hand for matching the warmth.' },
      { kind: 'button', label: 'Open the order', url: orderUrl(facts) },
    ],
  }
}

function toSeller(facts: Shipped): Omit<Letter, 'to'> {
  const { order, shipment, buyer } = facts
  const text =
    order.state === 'ready'
      ? 'Look at the way once more before packing: a check counts for 12 hours.'
      : 'Mark the order ready when the animals are counted, and look at the way before packing.'
  return {
    subject: `Tomorrow: ${boxWords(shipment.boxes)} to ${buyer.name}`,
    heading: 'A box leaves tomorrow',
    blocks: [
      orderTag(facts),
      { kind: 'facts', rows: daysRows(shipment, order) },
      { kind: 'text', text },
      { kind: 'button', label: 'Packing sheet and labels', url: orderUrl(facts) },
    ],
  }
}

/** The reminder of one party of a shipped order. It may be switched off, so it names its list. */
export function boxReminder(facts: Shipped, party: 'buyer' | 'seller'): Letter {
  const to = party === 'buyer' ? facts.buyer : facts.sellerPerson
  const letter = party === 'buyer' ? toBuyer(facts) : toSeller(facts)
  return { to, ...letter, optional: { list: 'reminders', memberId: to.memberId } }
}
