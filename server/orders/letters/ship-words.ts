import type { OrderRow } from '@/server/orders/order-store'
import type { ShipmentRow } from '@/server/orders/shipment-store'
import { printDay } from '@/shared/times/print-time'

/** The day on which the box leaves, at the seller's place: 'Mon, May 10'. */
export const leavesWords = ({ slotStartsAt, zone }: Pick<OrderRow, 'slotStartsAt' | 'zone'>) =>
  slotStartsAt ? printDay(slotStartsAt.toISOString(), zone) : 'not chosen yet'

/** The day on which it arrives, where it arrives. */
export const arrivesWords = ({ promisedAt, toZone }: Pick<ShipmentRow, 'promisedAt' | 'toZone'>) =>
  printDay(promisedAt.toISOString(), toZone)

/** Both days as rows of a mail. */
export const daysRows = (shipment: ShipmentRow, order: OrderRow): [string, string][] => [
  ['Leaves', leavesWords(order)],
  ['Arrives', arrivesWords(shipment)],
]

export const boxWords = (boxes: number) => (boxes === 1 ? '1 box' : `${boxes} boxes`)

/** Where the buyer waits for the box. */
export const waitWords = (deliverTo: string) =>
  deliverTo === 'counter'
    ? 'Fetch it at the carrier’s counter as soon as it is there.'
    : 'Be at home to take it in: a box on a porch or in a mailbox gets too hot or too cold within the hour.'
