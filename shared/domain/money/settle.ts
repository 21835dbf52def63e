import { feeAfterRefundsCents } from '@/shared/domain/money/give-back-fee'

export interface SettlingOrder {
  /** All that was captured from the buyer. */
  chargedCents: number
  goodsCents: number
  /** Tax that stays due after refunds; never part of the seller's share. */
  taxCents: number
  refundedGoodsCents: number
  /** Box, freight and tax given back. */
  refundedOtherCents: number
  feeBp: number
  /** What the seller owes from earlier orders. */
  debtCents: number
}

export interface Settlement {
  transferCents: number
  feeCents: number
  taxCents: number
  refundedCents: number
  debtRecoveredCents: number
}

/**
 * One transfer per order: charged less refunds, tax, the fee that remains and debt recovered, never below zero.
 * The five parts sum to what was charged. Throws RangeError when refunds, tax and fee exceed it.
 */
export function settle(order: SettlingOrder): Settlement {
  const { chargedCents, goodsCents, taxCents, refundedGoodsCents, refundedOtherCents, feeBp, debtCents } =
    order
  const refundedCents = refundedGoodsCents + refundedOtherCents
  const feeCents = feeAfterRefundsCents(goodsCents, refundedGoodsCents, feeBp)
  const dueCents = chargedCents - refundedCents - taxCents - feeCents
  if (dueCents < 0) throw new RangeError(`the order gave away ${-dueCents} cents more than it took`)
  const debtRecoveredCents = Math.min(debtCents, dueCents)
  return {
    transferCents: dueCents - debtRecoveredCents,
    feeCents,
    taxCents,
    refundedCents,
    debtRecoveredCents,
  }
}
