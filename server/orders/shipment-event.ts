import { describeListing } from '@/server/listings/describe-listing'
import { orderUrl, type LetterFacts } from '@/server/orders/letters/letter-facts'
import { boxWords, waitWords } from '@/server/orders/letters/ship-words'
import type { ShipmentRow } from '@/server/orders/shipment-store'
import type { CalendarEvent } from '@/shared/calendar/write-calendar'

/** What differs between a pickup and a box. */
export type OrderEvent = Pick<CalendarEvent, 'startsAt' | 'endsAt' | 'summary' | 'description' | 'location'>

/** A promised day begins so long before its end: from nine in the morning until eight. House rule. */
const ARRIVAL_MS = 11 * 3_600_000

type Shipped = LetterFacts & { shipment: ShipmentRow }

const whatOf = ({ order, terms }: Shipped) => `${order.quantity} × ${describeListing(terms).title}`

function arrival(facts: Shipped): OrderEvent {
  const { shipment } = facts
  const { promisedAt, deliverTo, address, tracking, carrier } = shipment
  return {
    startsAt: new Date(promisedAt.getTime() - ARRIVAL_MS),
    endsAt: promisedAt,
    summary: `Arriving: ${whatOf(facts)}`,
    description: [
      `${boxWords(shipment.boxes)}, ${carrier}${tracking ? `, ${tracking}` : ''}`,
      waitWords(deliverTo),
      orderUrl(facts),
    ].join('\n'),
    ...(deliverTo === 'door'
      ? { location: `${address.street}, ${address.city}, ${address.state} ${address.zip}` }
      : {}),
  }
}

function departure(facts: Shipped): OrderEvent | null {
  const { order, shipment, buyer } = facts
  if (!order.slotStartsAt || !order.slotEndsAt) return null
  return {
    startsAt: order.slotStartsAt,
    endsAt: order.slotEndsAt,
    summary: `Ship ${whatOf(facts)} to ${buyer.name}`,
    description: [
      `${boxWords(shipment.boxes)}, ${shipment.carrier}`,
      'Look at the way once more before packing: a check counts for 12 hours.',
      orderUrl(facts),
    ].join('\n'),
  }
}

/** The event of a shipped order: for the buyer the day it arrives, for the seller the day it leaves. */
export function shipmentEvent(facts: Shipped, party: 'buyer' | 'seller'): OrderEvent | null {
  const event = party === 'buyer' ? arrival(facts) : departure(facts)
  const isOver = facts.order.state === 'cancelled'
  return event && isOver ? { ...event, description: 'This order has ended; no box leaves.' } : event
}
