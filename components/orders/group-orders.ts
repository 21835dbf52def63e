import type { OrderRow } from '@/shared/contracts/orders'
import { whoseMove } from '@/shared/domain/orders/whose-move'

export interface OrderGroups {
  yours: OrderRow[]
  coming: OrderRow[]
  past: OrderRow[]
}

const isOver = ({ state }: OrderRow) => state === 'settled' || state === 'cancelled'

export function isYourMove(order: OrderRow): boolean {
  const { whose } = whoseMove(order)
  return whose === 'you' || whose === 'both'
}

/** A member's orders by what they ask of the reader: to act, to wait, nothing any more. Each keeps its order. */
export function groupOrders(orders: readonly OrderRow[]): OrderGroups {
  return {
    yours: orders.filter(isYourMove),
    coming: orders.filter((order) => !isOver(order) && !isYourMove(order)),
    past: orders.filter(isOver),
  }
}
