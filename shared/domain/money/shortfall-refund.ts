import { linePartCents, type LinePrice } from '@/shared/domain/money/line-total'

export interface Arrival {
  ordered: number
  /** Alive on arrival, extras included: overcount absorbs deaths first. */
  alive: number
  /** As it was paid. */
  price: LinePrice
  boxCents: number
  freightCents: number
  isSellersFault: boolean
  /** The listing promises box and freight back for any shortfall. */
  promisesFreight: boolean
}

export interface ShortfallRefund {
  shortfall: number
  goodsCents: number
  boxAndFreightCents: number
  refundCents: number
}

/**
 * What a buyer gets back for animals that did not arrive alive: the shortfall at the price paid; box and freight too
 * when fewer than half arrived alive, when the seller is at fault, or when the listing promised it.
 */
export function shortfallRefund(arrival: Arrival): ShortfallRefund {
  const { ordered, alive, price, boxCents, freightCents, isSellersFault, promisesFreight } = arrival
  const arrived = Math.min(ordered, Math.max(0, alive))
  const shortfall = ordered - arrived
  const goodsCents = linePartCents(price, { from: arrived, to: ordered })
  const isFreightBack = shortfall > 0 && (arrived * 2 < ordered || isSellersFault || promisesFreight)
  const boxAndFreightCents = isFreightBack ? boxCents + freightCents : 0
  return { shortfall, goodsCents, boxAndFreightCents, refundCents: goodsCents + boxAndFreightCents }
}
