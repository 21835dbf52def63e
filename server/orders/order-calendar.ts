import { now } from '@/server/clock'
import type { Letter } from '@/server/mail/letter'
import { mailSender } from '@/server/mail/mail-sender'
import { describeListing } from '@/server/listings/describe-listing'
import { orderUrl, type LetterFacts } from '@/server/orders/letters/letter-facts'
import { mayMeet } from '@/server/orders/order-policy'
import { shipmentEvent, type OrderEvent } from '@/server/orders/shipment-event'
import { writeCalendar } from '@/shared/calendar/write-calendar'
import { printCents } from '@/shared/units/money'

type CalendarFile = NonNullable<Letter['calendar']>

/** The order's name in everybody's calendar: no move and no end changes it, nor does a new address of the site. */
const uidOf = (publicId: string) => `pickup-${publicId}@tankward`

function summaryOf(facts: LetterFacts, party: 'buyer' | 'seller'): string {
  const what = `${facts.order.quantity} × ${describeListing(facts.terms).title}`
  return party === 'buyer' ? `Pick up ${what}` : `${facts.buyer.name} picks up ${what}`
}

function descriptionOf(facts: LetterFacts, party: 'buyer' | 'seller'): string {
  const { order, seller } = facts
  if (order.state === 'cancelled') return 'This order has ended; nobody needs to come.'
  if (order.state === 'weather_hold') return 'Held for weather: wait for the new day.'
  const rest = order.balancePaidAt === null && order.balanceCents > 0 ? printCents(order.balanceCents) : null
  const lines =
    party === 'buyer'
      ? [
          mayMeet(order, party) ? `${seller.farmName}, ${seller.phone}` : seller.farmName,
          'Bring a lidded bucket or cooler half full of your own tank water.',
          rest ? `Still to pay: ${rest}` : 'Everything is paid.',
        ]
      : [
          rest ? `The buyer still pays ${rest}.` : 'Everything is paid.',
          'Count together; the code comes last.',
        ]
  return [...lines, orderUrl(facts)].join('\n')
}

function pickupEvent(facts: LetterFacts, party: 'buyer' | 'seller'): OrderEvent | null {
  const { order, seller } = facts
  if (!order.slotStartsAt || !order.slotEndsAt) return null
  return {
    startsAt: order.slotStartsAt,
    endsAt: order.slotEndsAt,
    summary: summaryOf(facts, party),
    description: descriptionOf(facts, party),
    // The true place follows the same rule as on the order's page.
    ...(mayMeet(order, party)
      ? { location: `${seller.street}, ${seller.city}, ${seller.state} ${seller.zip}` }
      : {}),
  }
}

/** The pickup, or the box, as a calendar file for one party; null while no time was agreed. */
export function orderCalendar(facts: LetterFacts, party: 'buyer' | 'seller'): CalendarFile | null {
  const { order, agreement, shipment } = facts
  const event = shipment ? shipmentEvent({ ...facts, shipment }, party) : pickupEvent(facts, party)
  if (!agreement || !event) return null
  // A held day is off until another one is agreed; the file that says so brings it back.
  const isCancelled = order.state === 'cancelled' || order.state === 'weather_hold'
  const text = writeCalendar({
    ...event,
    uid: uidOf(order.publicId),
    sequence: agreement.sequence,
    stampedAt: now(),
    isCancelled,
    url: orderUrl(facts),
    organizerEmail: mailSender().address,
  })
  const fileName = shipment ? 'box.ics' : 'pickup.ics'
  return { fileName, method: isCancelled ? 'CANCEL' : 'PUBLISH', text }
}
