import type { HoldRow } from '@/server/orders/hold-store'
import { mayReadAddress } from '@/server/orders/order-policy'
import type { OrderSeen } from '@/server/orders/party-of'
import type { ShipmentRow } from '@/server/orders/shipment-store'
import { reasonsOf } from '@/server/shipping/reasons-of'
import type { RouteCheckRow } from '@/server/weather/weather-store'
import type { ShownHold, ShownRouteCheck, ShownShipment } from '@/shared/contracts/shipments'
import type { GateVerdict } from '@/shared/contracts/rules'
import { clockMs } from '@/shared/domain/orders/clocks.facts'

export interface ShipmentFacts {
  shipment: ShipmentRow
  check?: RouteCheckRow | undefined
  gate?: GateVerdict | undefined
}

function goodUntil({ shipDay }: ShipmentRow, check: RouteCheckRow): Pick<ShownRouteCheck, 'goodUntil'> {
  if (check.verdict !== 'safe' || check.shipDay !== shipDay) return {}
  return { goodUntil: new Date(check.at.getTime() + clockMs('temperatureSnapshot', 'fish')).toISOString() }
}

function presentCheck(shipment: ShipmentRow, check: RouteCheckRow): ShownRouteCheck {
  const { basis, packing, reasons, worst } = check.facts
  const verdict = check.verdict as ShownRouteCheck['verdict']
  return {
    kind: check.kind as ShownRouteCheck['kind'],
    at: check.at.toISOString(),
    ...{ shipDay: check.shipDay, verdict, basis },
    ...(packing && verdict === 'safe' ? { packing } : {}),
    reasons: reasonsOf({ verdict, reasons }),
    ...(worst ? { worst } : {}),
    ...goodUntil(shipment, check),
  }
}

/** The shipment of an order as one party may see it: the address, and the paper that holds it, by the policy. */
export function presentShipment({ order, party }: OrderSeen, facts: ShipmentFacts): ShownShipment {
  const { shipment, check, gate } = facts
  const { shipDay, arriveDay, toZone, boxes, carrier, papers } = shipment
  const { tracking, dispatchedAt, arrivedAt, aliveCount, movement } = shipment
  const mayRead = mayReadAddress(order, party)
  return {
    ...{ shipDay, arriveDay, toZone, boxes, carrier, papers },
    promisedAt: shipment.promisedAt.toISOString(),
    packing: shipment.packing as ShownShipment['packing'],
    deliverTo: shipment.deliverTo === 'counter' ? 'counter' : 'door',
    papersNeeded: gate?.papersNeeded ?? [],
    ...(mayRead ? { address: shipment.address } : {}),
    ...(tracking === null ? {} : { tracking }),
    ...(dispatchedAt ? { dispatchedAt: dispatchedAt.toISOString() } : {}),
    ...(arrivedAt ? { arrivedAt: arrivedAt.toISOString() } : {}),
    ...(aliveCount === null ? {} : { aliveCount }),
    ...(check ? { check: presentCheck(shipment, check) } : {}),
    ...(mayRead && movement ? { movement } : {}),
  }
}

function proposedOf({
  proposedStartsAt,
  proposedEndsAt,
  proposedShipDay,
}: HoldRow): Pick<ShownHold, 'proposed'> {
  if (!proposedStartsAt || !proposedEndsAt) return {}
  return {
    proposed: {
      startsAt: proposedStartsAt.toISOString(),
      endsAt: proposedEndsAt.toISOString(),
      ...(proposedShipDay ? { shipDay: proposedShipDay } : {}),
    },
  }
}

/** The last hold of an order; `windowId` is the public id of a pickup window that was proposed. */
export function presentHold(hold: HoldRow, windowId: string | undefined): ShownHold {
  const proposed = proposedOf(hold).proposed
  return {
    number: hold.number,
    startedBy: hold.startedBy === 'seller' ? 'seller' : 'system',
    startedAt: hold.startedAt.toISOString(),
    why: hold.why,
    ...(proposed ? { proposed: { ...proposed, ...(windowId ? { windowId } : {}) } } : {}),
    silenceMoves: hold.silenceMoves,
    ...(hold.answer ? { answer: hold.answer as ShownHold['answer'] } : {}),
  }
}
