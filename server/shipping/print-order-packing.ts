import { inTransaction } from '@/db/transaction'
import type { Caller } from '@/server/http/caller'
import { mayReadAddress } from '@/server/orders/order-policy'
import { renderPackingSheet } from '@/server/packing/packing-sheet'
import { boxLabels } from '@/server/shipping/box-labels'
import { planOfCheck } from '@/server/shipping/judge-way'
import { orderShippedFor, type OrderShipped } from '@/server/shipping/order-shipped'
import { reasonsOf } from '@/server/shipping/reasons-of'
import { readLatestCheck } from '@/server/shipping/route-check-store'
import type { RouteCheckRow } from '@/server/weather/weather-store'
import { Problem } from '@/shared/api/problem'
import { dateAfter } from '@/shared/domain/calendar/day-number'
import { printDate } from '@/shared/domain/calendar/print-date'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import { FORECAST_DAYS } from '@/shared/domain/shipping/forecast-weather'
import type { ShipmentPlan } from '@/shared/domain/shipping/plan-shipment'
import { shipmentSheet } from '@/shared/domain/shipping/shipment-sheet'

function planOf({ order, shipment, terms }: OrderShipped, check: RouteCheckRow | undefined): ShipmentPlan {
  const { shipDay, boxes } = shipment
  if (check && check.verdict !== 'safe') {
    throw new Problem(
      'trip-unsafe',
      reasonsOf({ verdict: check.verdict, reasons: check.facts.reasons }).join(' '),
    )
  }
  const plan = check && planOfCheck({ terms, quantity: order.quantity, boxes }, check.facts)
  if (plan) return plan
  throw new Problem(
    'packing-open',
    `The forecast decides how these boxes are packed, and it reaches ${printDate(shipDay)} from ${printDate(dateAfter(shipDay, -FORECAST_DAYS))} on. Look at the way once more then; the sheet is here as soon as that is done.`,
  )
}

/** Packing sheet and labels of an order as PDF, for its seller alone: the labels carry the buyer's address. */
export async function printOrderPacking(caller: Caller, orderId: string): Promise<Uint8Array<ArrayBuffer>> {
  const shipped = await orderShippedFor('seller', caller, orderId)
  const { order, shipment, seller } = shipped
  if (!mayReadAddress(order, 'seller')) {
    throw new Problem('order-moved', 'The labels are here while a day is agreed.', {
      facts: { state: order.state },
    })
  }
  const check = await inTransaction((tx) => readLatestCheck(tx, order.id, shipment.shipDay))
  const plan = planOf(shipped, check)
  const { quantity } = order
  const sheet = shipmentSheet({
    ...{ plan, quantity, boxes: shipment.boxes },
    isForecast: check?.facts.basis === 'forecast',
    boxRule: fillCaution('G-14', {}),
  })
  return renderPackingSheet(sheet, boxLabels({ shipment, seller, plan, quantity }))
}
