import { lineTotalCents } from '@/shared/domain/money/line-total'
import { shareOfCents } from '@/shared/domain/money/round-half-up'
import { tierFor, type PriceTier } from '@/shared/domain/money/tier-price'

interface Terms {
  boxCents: number
  freightCents: number
  taxCents: number
  depositBp: number
  /** Fixed with the order; falls on goods alone. */
  feeBp: number
}

export interface OrderTotals {
  goodsCents: number
  boxCents: number
  freightCents: number
  taxCents: number
  totalCents: number
  depositCents: number
  /** Always total less deposit, never rounded by itself. */
  balanceCents: number
  feeCents: number
}

/** A deposit is at least a dollar, or all of the goods when they cost less. */
const leastDepositCents = 100

/** Totals of an order from the value of its goods (after discounts). Whole cents and basis points throughout. */
export function quoteTotals(goodsCents: number, terms: Terms): OrderTotals {
  const { boxCents, freightCents, taxCents, depositBp, feeBp } = terms
  const totalCents = goodsCents + boxCents + freightCents + taxCents
  const share = shareOfCents(goodsCents, depositBp)
  const depositCents = Math.min(goodsCents, Math.max(share, leastDepositCents))
  return {
    goodsCents,
    boxCents,
    freightCents,
    taxCents,
    totalCents,
    depositCents,
    balanceCents: totalCents - depositCents,
    feeCents: shareOfCents(goodsCents, feeBp),
  }
}

/** Totals at the tier the quantity buys at. Throws RangeError below the first tier: the listing's minimum comes first. */
export function quoteOrder(
  asked: Terms & { tiers: readonly PriceTier[]; quantity: number },
): OrderTotals & { unitCents: number } {
  const tier = tierFor(asked.tiers, asked.quantity)
  if (!tier) throw new RangeError(`no price tier for ${asked.quantity}`)
  const goodsCents = lineTotalCents({ kind: 'each', unitCents: tier.unitCents }, asked.quantity)
  return { ...quoteTotals(goodsCents, asked), unitCents: tier.unitCents }
}
