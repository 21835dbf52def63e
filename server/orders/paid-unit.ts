import type { OrderRow } from '@/server/orders/order-store'

type Priced = Pick<OrderRow, 'goodsCents' | 'cutFromBalanceCents' | 'quantity' | 'quantityCut'>

/** What one unit cost when it was ordered: a later cut changes how many there are, never the price. */
export function paidUnitCents(order: Priced): number {
  return (order.goodsCents + order.cutFromBalanceCents) / (order.quantity + order.quantityCut)
}
