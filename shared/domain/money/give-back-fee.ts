import { shareOfCents } from '@/shared/domain/money/round-half-up'

/** The platform fee that stays when this much of the goods has been refunded so far. */
export function feeAfterRefundsCents(goodsCents: number, refundedGoodsCents: number, feeBp: number): number {
  return shareOfCents(goodsCents - refundedGoodsCents, feeBp)
}

/**
 * The fee given back with one more refund of goods. Cumulative: refunds one by one give back exactly what one refund
 * of their sum would, so no cent is lost to rounding.
 */
export function giveBackFeeCents(order: {
  goodsCents: number
  refundedBeforeCents: number
  refundCents: number
  feeBp: number
}): number {
  const { goodsCents, refundedBeforeCents, refundCents, feeBp } = order
  return (
    feeAfterRefundsCents(goodsCents, refundedBeforeCents, feeBp) -
    feeAfterRefundsCents(goodsCents, refundedBeforeCents + refundCents, feeBp)
  )
}
