import type { OrderRow } from '@/server/orders/order-store'
import type { ShipmentRow } from '@/server/orders/shipment-store'
import type { RouteCheckRow } from '@/server/weather/weather-store'
import type { RouteRow } from '@/shared/contracts/ship-acts'
import { reasonSentences } from '@/shared/domain/shipping/reason-sentences'
import { worstWords } from '@/shared/domain/shipping/worst-words'
import { printBothTemperatures } from '@/shared/units/temperature'

interface RouteParts {
  order: OrderRow
  shipment: ShipmentRow
  title: string
  buyerName: string
  /** The last one of the agreed day. */
  check: RouteCheckRow | undefined
}

/** The worst of the way, or how the boxes are to be packed, in a sentence. */
function wordsOfCheck({ verdict, facts }: Pick<RouteCheckRow, 'verdict' | 'facts'>): string {
  const { worst, packing, reasons } = facts
  if (verdict === 'unknown') return 'Nobody can say: figures or weather are missing for this way.'
  if (worst) return worstWords(worst)
  if (verdict === 'unsafe') return reasonSentences(reasons)[0] ?? 'Not safe.'
  if (!packing) return 'Safe when packed as the forecast asks; that comes within a week of the day.'
  const packs =
    packing.packs === 'none' ? 'no packs' : `${packing.packCount} ${packing.packs} packs in each box`
  return `Safe: ${packs}, packed at ${printBothTemperatures(packing.startC, 'us')}.`
}

export function presentRoute({ order, shipment, title, buyerName, check }: RouteParts): RouteRow {
  return {
    orderId: order.publicId,
    state: order.state as RouteRow['state'],
    title,
    quantity: order.quantity,
    buyerName,
    to: `${shipment.address.city}, ${shipment.address.state}`,
    shipDay: shipment.shipDay,
    arriveDay: shipment.arriveDay,
    boxes: shipment.boxes,
    balancePaid: order.balanceCents === 0 || order.balancePaidAt !== null,
    ...(check
      ? {
          verdict: check.verdict as RouteRow['verdict'],
          basis: check.facts.basis,
          checkedAt: check.at.toISOString(),
          words: wordsOfCheck(check),
        }
      : {}),
  }
}
