import type { SellerRow } from '@/server/orders/party-store'
import { requireOrderSize } from '@/server/orders/require-order-size'
import type { ReserveAsked } from '@/server/orders/reserve-batch'
import type { FoundPlace } from '@/server/places/find-place'
import type { JudgedWay } from '@/server/shipping/judge-way'
import { notShippedTo } from '@/server/shipping/may-ship-to'
import { requireLawfulDay, requireSafeWay } from '@/server/shipping/require-ship-day'
import { shippingOf } from '@/server/shipping/ship-rule'
import { promisedAtOf, shipSlot } from '@/server/shipping/ship-slot'
import { wayTo } from '@/server/shipping/ship-way'
import { Problem, type FieldProblem } from '@/shared/api/problem'
import type { FishBody } from '@/shared/contracts/fish-batch'
import type { ListingBody } from '@/shared/contracts/listings'
import type { BoxCharges } from '@/shared/domain/shipping/box-charges'

type AskedShip = NonNullable<ReserveAsked['ship']>

/** Everything a shipped order needs beside the pickup's facts, found before anything is held. */
export interface ReservedShipment {
  ask: AskedShip
  charges: BoxCharges
  shipDay: string
  arriveDay: string
  promisedAt: Date
  slot: { slotStartsAt: Date; slotEndsAt: Date }
  carrier: string
  packing: string
  judged: JudgedWay
}

interface Wanted {
  asked: ReserveAsked
  terms: ListingBody
  seller: SellerRow
  place: FoundPlace
}

/** The address says the same place as the one that was judged, and one that the seller ships to. */
function addressFaults(
  ask: AskedShip,
  { asked, terms, place }: Wanted & { terms: FishBody },
): FieldProblem[] {
  const { address, deliverTo } = ask
  const faults: FieldProblem[] = []
  if (address.zip !== asked.near) {
    const detail = 'The way was judged for another ZIP code. Put this one in where you said where you live.'
    faults.push({ detail, pointer: '#/ship/address/zip' })
  } else if (address.state !== place.state) {
    const detail = `ZIP code ${address.zip} lies in ${place.state}.`
    faults.push({ detail, pointer: '#/ship/address/state' })
  } else {
    const why = notShippedTo(terms, address.state)
    if (why) faults.push({ detail: why, pointer: '#/ship/address/state' })
  }
  if (deliverTo === 'counter' && !shippingOf(terms).holdsAtCounter) {
    const detail = 'The seller’s carrier does not keep boxes at a counter. Choose your door.'
    faults.push({ detail, pointer: '#/ship/deliverTo' })
  }
  if (asked.windowId !== undefined) {
    const detail = 'Either a pickup time or a ship day, not both.'
    faults.push({ detail, pointer: '#/windowId' })
  }
  return faults
}

/** Judges what a buyer wants shipped; refused with every fault of the form, then for the day, then for the weather. */
export async function planReserved(wanted: Wanted): Promise<ReservedShipment | null> {
  const { asked, terms, seller, place } = wanted
  const { ship: ask } = asked
  if (!ask) return null
  if (terms.category !== 'fish' || !terms.shipping)
    throw new Problem('not-shipped', notShippedTo(terms, place.state) ?? undefined)
  const errors = addressFaults(ask, { ...wanted, terms })
  if (errors.length > 0) throw new Problem('fields-invalid', undefined, { errors })
  const way = wayTo({ terms, seller, quantity: asked.quantity }, place)
  requireOrderSize(terms, { quantity: asked.quantity, charges: way.charges, pointer: '#/quantity' })
  const { shipDay } = ask
  const { arriveDay } = await requireLawfulDay(way, { shipDay, pointer: '#/ship/shipDay' })
  const judged = await requireSafeWay(way, shipDay)
  const { carrier, packing } = shippingOf(terms)
  return {
    ...{ ask, judged, shipDay, arriveDay, carrier, packing, charges: way.charges },
    promisedAt: promisedAtOf(arriveDay, place.zone),
    slot: shipSlot(shipDay, seller.zone),
  }
}
