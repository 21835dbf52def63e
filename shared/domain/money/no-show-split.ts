import { shareOfCents } from '@/shared/domain/money/round-half-up'

export interface KeptSplit {
  keptCents: number
  feeCents: number
  sellerCents: number
  refundCents: number
}

/**
 * A forfeited order: never more than the listing's deposit is kept, even when everything was paid; the fee falls on
 * what is kept, tax does not; the rest goes back. Kept + refund = charged; fee + seller = kept.
 */
export function noShowSplit(order: { chargedCents: number; depositCents: number; feeBp: number }): KeptSplit {
  const keptCents = Math.min(order.chargedCents, order.depositCents)
  const feeCents = shareOfCents(keptCents, order.feeBp)
  return {
    keptCents,
    feeCents,
    sellerCents: keptCents - feeCents,
    refundCents: order.chargedCents - keptCents,
  }
}
