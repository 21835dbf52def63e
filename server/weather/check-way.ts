import { inTransaction } from '@/db/transaction'
import { now } from '@/server/clock'
import { lockOrder, type OrderRow } from '@/server/orders/order-store'
import { judgeWay, type JudgedWay } from '@/server/shipping/judge-way'
import { holdOrder } from '@/server/weather/hold-order'
import { loadOrderWay, type OrderWay } from '@/server/weather/order-way'
import { proposeShipDay } from '@/server/weather/propose-ship-day'
import { insertRouteCheck, type RouteCheckKind } from '@/server/weather/weather-store'
import { printDate } from '@/shared/domain/calendar/print-date'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import { reasonSentences } from '@/shared/domain/shipping/reason-sentences'
import { printBothTemperatures } from '@/shared/units/temperature'

interface Checking {
  kind: RouteCheckKind
  /** Whether a way that is not safe holds its order (E18, E27). */
  holds: boolean
  isFresh: boolean
}

/** G-10, or the same without a day when none can be named. */
function whyOf(way: OrderWay, judged: JudgedWay, proposed: string | null): string {
  const day = printDate(way.shipment.shipDay)
  const { worst, reasons } = judged.facts
  if (!worst) {
    const [text = 'The way is not safe.'] = reasonSentences(reasons)
    return `${text} You may cancel for a full refund.`
  }
  const extreme = worst.side
  const temperature = printBothTemperatures(worst.airC, 'us')
  if (proposed) {
    return fillCaution('G-10', {
      extreme,
      day,
      place: worst.place,
      temperature,
      date: printDate(proposed),
    })
  }
  return `The route is too ${extreme} on ${day}: ${worst.place} ${temperature}. No better day can be named yet. You may cancel for a full refund.`
}

/**
 * Looks at the way of an order now, keeps what was found, and holds the order when asked to and it is not safe. An
 * answer `unknown` is kept and holds nothing: nobody knows that it is unsafe, and the dispatch gate still wants a safe one.
 * True: the order was held.
 */
export async function checkWay(order: OrderRow, { kind, holds, isFresh }: Checking): Promise<boolean> {
  const way = await loadOrderWay(order)
  if (!way) return false
  const { shipDay } = way.shipment
  const { charges, ...asked } = way.way
  const judged = await judgeWay({ ...asked, boxes: charges.boxes, shipDay, isFresh })
  const isRed = judged.verdict === 'unsafe' && holds
  const proposed = isRed ? await proposeShipDay(way) : null
  return inTransaction(async (tx) => {
    const locked = await lockOrder(tx, order.id)
    if (!locked) return false
    await insertRouteCheck(tx, {
      orderId: order.id,
      kind,
      shipDay,
      at: now(),
      verdict: judged.verdict,
      facts: judged.facts,
    })
    const isSameDay = locked.slotStartsAt?.getTime() === order.slotStartsAt?.getTime()
    if (!isRed || !isSameDay || !['scheduled', 'ready'].includes(locked.state)) return false
    await holdOrder(tx, locked, {
      startedBy: kind === 'seller' ? 'seller' : 'system',
      commandId: `weather:${kind}:${shipDay}:${locked.version}`,
      why: whyOf(way, judged, proposed),
      proposed: proposed ? { shipDay: proposed } : {},
    })
    return true
  })
}
