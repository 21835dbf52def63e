import type { OrderRow } from '@/server/orders/order-store'
import type { ShownOrder } from '@/shared/contracts/orders'

export type Party = ShownOrder['party']
type OrderAct = ShownOrder['may'][number]

export interface OrderViewer {
  party: Party
}

const isRunning = (order: OrderRow) => order.freeze === 'none'
const isBalancePaid = (order: OrderRow) => order.balanceCents === 0 || order.balancePaidAt !== null

/** One readable line an act: who may do it, and in which state. The same answers guard the acts and fill `may`. */
const abilities: Record<OrderAct, (order: OrderRow, party: Party) => boolean> = {
  'pay-deposit': (order, party) => party === 'buyer' && order.state === 'reserved',
  leave: (order, party) => party === 'buyer' && order.state === 'reserved',
  withdraw: (order, party) => party === 'buyer' && order.state === 'requested' && order.acceptedAt === null,
  accept: (order, party) => party === 'seller' && order.state === 'requested' && order.acceptedAt === null,
  decline: (order, party) => party === 'seller' && order.state === 'requested' && order.acceptedAt === null,
  'mark-ready': (order, party) =>
    party === 'seller' &&
    order.state === 'scheduled' &&
    (order.balanceDue === 'at-handover' || isBalancePaid(order)),
  'pay-balance': (order, party) =>
    party === 'buyer' && ['scheduled', 'ready'].includes(order.state) && !isBalancePaid(order),
  'hand-over': (order, party) => party === 'seller' && order.state === 'ready' && isBalancePaid(order),
  'confirm-good': (order, party) => party === 'buyer' && order.state === 'handed_over',
}

export function mayAct(act: OrderAct, order: OrderRow, party: Party): boolean {
  return isRunning(order) && abilities[act](order, party)
}

export function actsOf(order: OrderRow, party: Party): OrderAct[] {
  return (Object.keys(abilities) as OrderAct[]).filter((act) => mayAct(act, order, party))
}

/** The true place and phone: for the two parties alone, from `scheduled` until the order is over. */
export function mayMeet(order: OrderRow, party: Party): boolean {
  return (
    party !== 'staff' &&
    ['scheduled', 'weather_hold', 'ready', 'handed_over', 'claim_open'].includes(order.state)
  )
}

/** The code appears to the buyer when the animals are ready and nothing is left to pay. */
export function maySeeCode(order: OrderRow, party: Party): boolean {
  return party === 'buyer' && order.state === 'ready' && isBalancePaid(order)
}
