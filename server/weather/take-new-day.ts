import type { Tx } from '@/db/transaction'
import { applyEdge } from '@/server/orders/apply-edge'
import type { HoldRow } from '@/server/orders/hold-store'
import { findWindow, freeSlot, holdSlot, type OrderRow } from '@/server/orders/order-store'
import { queueLettersOf } from '@/server/orders/queue-order-letters'
import { changeShipment, readShipment } from '@/server/orders/shipment-store'
import { now } from '@/server/clock'
import { promisedAtOf, shipSlot } from '@/server/shipping/ship-slot'
import { rescheduled } from '@/server/weather/weather-letters'
import { Problem } from '@/shared/api/problem'
import { dateAfter } from '@/shared/domain/calendar/day-number'
import { packingClasses, type PackingClassId } from '@/shared/domain/season/season-classes.facts'

export interface NewDay {
  by: 'buyer' | 'timer'
  actorId?: string
  commandId: string
  /** Undefined: the proposed one. */
  shipDay?: string | undefined
  windowId?: string | undefined
}

async function shipDayChange(tx: Tx, order: OrderRow, shipDay: string): Promise<Partial<OrderRow>> {
  const shipment = await readShipment(tx, order.id)
  if (!shipment) throw new Error(`order ${order.id} is not shipped`)
  const { nights } = packingClasses[shipment.packing as PackingClassId]
  const arriveDay = dateAfter(shipDay, nights)
  await changeShipment(tx, order.id, {
    shipDay,
    arriveDay,
    promisedAt: promisedAtOf(arriveDay, shipment.toZone),
  })
  return shipSlot(shipDay, order.zone)
}

/** The place in the window that counted before is given back; the proposed one is held already. */
async function windowChange(
  tx: Tx,
  order: OrderRow,
  wanted: { hold: HoldRow; windowId?: string | undefined },
): Promise<Partial<OrderRow>> {
  const { hold, windowId } = wanted
  if (windowId === undefined) {
    if (hold.proposedWindowId === null)
      throw new Problem('slot-full', 'No time is proposed yet. Choose one that is offered.')
    if (hold.proposedStartsAt && hold.proposedStartsAt <= now())
      throw new Problem('slot-full', 'The proposed time has begun already. Choose one that is offered.')
    if (order.windowId !== null) await freeSlot(tx, order.windowId)
    return {
      windowId: hold.proposedWindowId,
      slotStartsAt: hold.proposedStartsAt,
      slotEndsAt: hold.proposedEndsAt,
    }
  }
  const window = await findWindow(tx, order.listingId, windowId)
  if (!window || window.startsAt <= now())
    throw new Problem('slot-full', 'That pickup time is not offered. Choose another.')
  const isHeldAlready = window.id === hold.proposedWindowId || window.id === order.windowId
  if (!isHeldAlready && !(await holdSlot(tx, window.id))) {
    throw new Problem('slot-full', 'That pickup time is full. Choose another.')
  }
  if (order.windowId !== null && order.windowId !== window.id) await freeSlot(tx, order.windowId)
  return { windowId: window.id, slotStartsAt: window.startsAt, slotEndsAt: window.endsAt, zone: window.zone }
}

/** E19: the new day counts, by the buyer's word or by silence. Give it the order as locked in this transaction. */
export async function takeNewDay(
  tx: Tx,
  held: { order: OrderRow; hold: HoldRow },
  day: NewDay,
): Promise<void> {
  const { order, hold } = held
  const shipDay = day.shipDay ?? hold.proposedShipDay
  const isShipped = order.handOver === 'ship'
  if (isShipped && !shipDay)
    throw new Problem('fields-invalid', undefined, {
      errors: [{ detail: 'No day is proposed yet. Choose one that is offered.', pointer: '#/shipDay' }],
    })
  const change =
    isShipped && shipDay
      ? await shipDayChange(tx, order, shipDay)
      : await windowChange(tx, order, { hold, windowId: day.windowId })
  const { order: after, applied } = await applyEdge(tx, {
    edge: 'E19',
    orderId: order.id,
    commandId: day.commandId,
    actor: day.by,
    ...(day.actorId ? { actorId: day.actorId } : {}),
    change: { ...change, isDayBySilence: day.by === 'timer' },
  })
  if (applied) await queueLettersOf(tx, { edge: 'E19', order: after, write: rescheduled })
}
