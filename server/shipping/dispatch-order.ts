import { inTransaction, type Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import type { Caller } from '@/server/http/caller'
import { applyEdge } from '@/server/orders/apply-edge'
import { mayAct } from '@/server/orders/order-policy'
import { hasCommand, lockOrder, readEvidence, type OrderRow } from '@/server/orders/order-store'
import { changeShipment, type ShipmentRow } from '@/server/orders/shipment-store'
import { showAgain } from '@/server/orders/show-order'
import { movementFactsOf } from '@/server/shipping/movement-facts'
import { reasonsOf } from '@/server/shipping/reasons-of'
import { orderShippedFor, requireShipment, type OrderShipped } from '@/server/shipping/order-shipped'
import { readLatestCheck } from '@/server/shipping/route-check-store'
import type { RouteCheckRow } from '@/server/weather/weather-store'
import { firstShipDay, sellersToday, shipRuleOf } from '@/server/shipping/ship-rule'
import { Problem } from '@/shared/api/problem'
import type { ParsedBody } from '@/shared/api/endpoint'
import type { Endpoints } from '@/shared/api/routes.gen'
import type { ShownOrder } from '@/shared/contracts/orders'
import { packingTicks } from '@/shared/contracts/ship-acts'
import { printDate } from '@/shared/domain/calendar/print-date'
import {
  judgeDispatch,
  type DispatchCheck,
  type DispatchFault,
} from '@/shared/domain/shipping/judge-dispatch'
import { judgeShipDay, nearestShipDay, type ShipDayRule } from '@/shared/domain/shipping/ship-days'

type Asked = ParsedBody<Endpoints['dispatchOrder']> & { commandId: string }

/** Known before anything is locked: none of it changes with the order. */
interface Known {
  papersNeeded: readonly string[]
  today: string
  /** The soonest day that could be chosen instead. */
  first: string
  rule: ShipDayRule
}

const isCheckVerdict = (verdict: string): verdict is DispatchCheck['verdict'] =>
  verdict === 'safe' || verdict === 'unsafe' || verdict === 'unknown'

function checkFacts(row: RouteCheckRow | undefined): DispatchCheck | null {
  if (!row) return null
  const verdict = isCheckVerdict(row.verdict) ? row.verdict : 'unknown'
  const { reasons, packing } = row.facts
  return {
    ...{ verdict, atMs: row.at.getTime() },
    isPackingKnown: packing !== undefined,
    reasons: reasonsOf({ verdict, reasons }),
  }
}

async function learn({ order, terms }: OrderShipped): Promise<Known> {
  const evidence = await readEvidence([order.id])
  const buyers = evidence.find((row) => row.party === 'buyer')
  const today = sellersToday(order.zone)
  return {
    papersNeeded: buyers?.shown.verdict.papersNeeded ?? [],
    today,
    first: firstShipDay(terms, order.zone),
    rule: await shipRuleOf(terms, today),
  }
}

/** The day agreed while it can still be kept, else the next one that could be chosen. */
function nearestDay(shipDay: string, { today, first, rule }: Known): string | undefined {
  const isKept = shipDay >= today && judgeShipDay(shipDay, rule).faults.length === 0
  return isKept ? shipDay : nearestShipDay(first, rule)?.shipDay
}

async function faultsOf(
  tx: Tx,
  { order, shipment, ticks }: { order: OrderRow; shipment: ShipmentRow; ticks: readonly string[] },
  known: Known,
): Promise<DispatchFault[]> {
  const { shipDay, arriveDay, papers } = shipment
  return judgeDispatch({
    isReady: order.state === 'ready',
    isBalanceCaptured: order.balanceCents === 0 || order.balancePaidAt !== null,
    papersNeeded: known.papersNeeded,
    ...{ papers, shipDay, arriveDay, ticks },
    today: judgeShipDay(known.today, known.rule),
    check: checkFacts(await readLatestCheck(tx, order.id, shipDay)),
    nowMs: now().getTime(),
    ticksNeeded: packingTicks,
  })
}

function refuse(
  faults: DispatchFault[],
  { today, nearest }: { today: string; nearest: string | undefined },
): void {
  if (faults.length === 0) return
  const errors = faults.map(({ detail, pointer }) => ({ detail, pointer }))
  const next =
    nearest && nearest !== today ? ` The nearest day on which it may leave is ${printDate(nearest)}.` : ''
  throw new Problem('dispatch-refused', `${faults[0]?.detail ?? ''}${next} The animals and the money stay.`, {
    errors,
    ...(nearest ? { facts: { nearestShipDay: nearest } } : {}),
  })
}

/** A seller who presses too early is told everything that is missing; an order past its gate has moved on. */
function mayTry(order: OrderRow): boolean {
  return mayAct('dispatch', order, 'seller') || order.state === 'scheduled'
}

async function sendOff(tx: Tx, shipped: OrderShipped, given: { asked: Asked; known: Known; by: string }) {
  const { asked, known, by } = given
  const order = await lockOrder(tx, shipped.order.id)
  if (!order) throw new Problem('not-found')
  if (await hasCommand(tx, order.id, asked.commandId)) return
  if (!mayTry(order)) throw new Problem('order-moved', undefined, { facts: { state: order.state } })
  const shipment = await requireShipment(tx, order.id)
  const faults = await faultsOf(tx, { order, shipment, ticks: asked.ticks }, known)
  refuse(faults, { today: known.today, nearest: nearestDay(shipment.shipDay, known) })
  const at = now()
  const { tracking } = asked
  const movement = movementFactsOf({ ...shipped, order, shipment, tracking, at })
  await changeShipment(tx, order.id, { tracking, dispatchedAt: at, movement })
  await applyEdge(tx, {
    edge: 'E29',
    orderId: order.id,
    commandId: asked.commandId,
    actor: 'seller',
    actorId: by,
    facts: { tracking, ticks: asked.ticks.join(' ') },
  })
}

/**
 * E29: the box goes to the carrier. Refused with every reason at once, unless the balance is in, every paper holds until
 * it arrives, the way was found safe within 12 hours, today is the agreed and a lawful day, and all ticks are there.
 */
export async function dispatchOrder(caller: Caller, orderId: string, asked: Asked): Promise<ShownOrder> {
  const shipped = await orderShippedFor('seller', caller, orderId)
  const known = await learn(shipped)
  await inTransaction((tx) => sendOff(tx, shipped, { asked, known, by: caller.memberId }))
  return showAgain(shipped)
}
