import { instantOf } from '@/server/listings/instant-of'
import { temperatureCheckHours } from '@/shared/domain/orders/clocks.facts'

// House rules: a ship day runs from the morning check to the closing of the counter, a promised day until the evening.
const LEAVES_BY = '18:00'
const ARRIVES_BY = '20:00'

function wallOf(day: string, time: string, zone: string): Date {
  const found = instantOf(day, time, zone)
  // Clocks change at night: these times exist once a day in every zone that we ship in.
  if (found.kind !== 'once') throw new RangeError(`${day} ${time} is not one moment in ${zone}`)
  return found.at
}

/** The working hours of a ship day at the seller's place: what an order that is shipped has as its slot. */
export function shipSlot(shipDay: string, zone: string): { slotStartsAt: Date; slotEndsAt: Date } {
  const morning = `${String(temperatureCheckHours.dayOf).padStart(2, '0')}:00`
  return { slotStartsAt: wallOf(shipDay, morning, zone), slotEndsAt: wallOf(shipDay, LEAVES_BY, zone) }
}

/** Until when a box is promised, where it arrives. */
export const promisedAtOf = (arriveDay: string, toZone: string): Date => wallOf(arriveDay, ARRIVES_BY, toZone)
