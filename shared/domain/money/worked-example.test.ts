import { describe, expect, it } from 'vitest'
import { allocateRefund } from '@/shared/domain/money/allocate-refund'
import { giveBackFeeCents } from '@/shared/domain/money/give-back-fee'
import { largestRemainder } from '@/shared/domain/money/largest-remainder'
import { noShowSplit } from '@/shared/domain/money/no-show-split'
import { quoteOrder } from '@/shared/domain/money/quote-order'
import { requotePool } from '@/shared/domain/money/requote-pool'
import { settle } from '@/shared/domain/money/settle'
import { shortfallRefund } from '@/shared/domain/money/shortfall-refund'

// 60 fish at $0.89, box $12.00, freight $48.50, deposit 25 % of goods, fee 600 bp, no tax.
const terms = { boxCents: 1200, freightCents: 4850, taxCents: 0, depositBp: 2500, feeBp: 600 }
const quote = quoteOrder({ ...terms, tiers: [{ fromCount: 25, unitCents: 89 }], quantity: 60 })
const paid = {
  chargedCents: quote.totalCents,
  goodsCents: quote.goodsCents,
  taxCents: 0,
  refundedGoodsCents: 0,
  refundedOtherCents: 0,
  feeBp: 600,
  debtCents: 0,
}

describe('sixty fish by the box, to the cent', () => {
  it('quotes goods, total, deposit, balance and fee', () => {
    expect(quote).toEqual({
      unitCents: 89,
      goodsCents: 5340,
      boxCents: 1200,
      freightCents: 4850,
      taxCents: 0,
      totalCents: 11_390,
      depositCents: 1335,
      balanceCents: 10_055,
      feeCents: 320,
    })
  })

  it('pays the seller 11,070 when all arrive alive', () => {
    expect(settle(paid)).toMatchObject({ transferCents: 11_070, feeCents: 320 })
  })

  it('refunds six of sixty, not the nine that died of sixty-three packed', () => {
    const arrival = {
      ordered: 60,
      alive: 54,
      price: { kind: 'each', unitCents: 89 } as const,
      boxCents: 1200,
      freightCents: 4850,
      isSellersFault: false,
      promisesFreight: false,
    }
    expect(shortfallRefund(arrival)).toEqual({
      shortfall: 6,
      goodsCents: 534,
      boxAndFreightCents: 0,
      refundCents: 534,
    })
    const fee = { goodsCents: 5340, refundedBeforeCents: 0, refundCents: 534, feeBp: 600 }
    expect(giveBackFeeCents(fee)).toBe(32)
    const settled = settle({ ...paid, refundedGoodsCents: 534 })
    expect(settled).toMatchObject({ transferCents: 10_568, feeCents: 288, refundedCents: 534 })
    expect(settled.transferCents + settled.feeCents + settled.refundedCents).toBe(11_390)
  })

  it('keeps 1,335 of a no-show and splits it 80 and 1,255', () => {
    expect(noShowSplit({ chargedCents: 11_390, depositCents: 1335, feeBp: 600 })).toEqual({
      keptCents: 1335,
      feeCents: 80,
      sellerCents: 1255,
      refundCents: 10_055,
    })
  })

  it('gives everything back, fee and freight too, when the seller lost the box', () => {
    const settled = settle({ ...paid, refundedGoodsCents: 5340, refundedOtherCents: 6050 })
    expect(settled).toMatchObject({ transferCents: 0, feeCents: 0, refundedCents: 11_390 })
  })

  it('refunds to the balance charge first', () => {
    const charges = [
      { id: 'deposit', purpose: 'deposit', chargedCents: 1335, refundedCents: 0 } as const,
      { id: 'balance', purpose: 'balance', chargedCents: 10_055, refundedCents: 10_000 } as const,
    ]
    expect(allocateRefund(534, charges)).toEqual([
      { id: 'balance', cents: 55 },
      { id: 'deposit', cents: 479 },
    ])
    expect(allocateRefund(1391, charges)).toBeNull()
  })
})

describe('other worked figures', () => {
  it('gives the fee of six fish at $8.90 back one by one without losing a cent', () => {
    const backs = Array.from({ length: 6 }, (_, at) =>
      giveBackFeeCents({ goodsCents: 5340, refundedBeforeCents: at * 890, refundCents: 890, feeBp: 600 }),
    )
    expect(backs).toEqual([53, 53, 54, 53, 54, 53])
    expect(backs.reduce((sum, back) => sum + back, 0)).toBe(320)
  })

  it('shares $61.00 of freight among the five members of a run', () => {
    expect(largestRemainder(6100, [25, 25, 30, 10, 20])).toEqual([1386, 1386, 1664, 555, 1109])
  })

  it('credits the deposit when the run reaches a cheaper tier', () => {
    const member = { quantity: 25, unitCents: 95, boxCents: 0, freightCents: 1386, taxCents: 0, feeBp: 600 }
    expect(requotePool({ ...member, depositPaidCents: 688 })).toMatchObject({
      goodsCents: 2375,
      totalCents: 3761,
      depositCents: 688,
      balanceCents: 3073,
      refundCents: 0,
    })
    expect(requotePool({ ...member, depositPaidCents: 4000 })).toMatchObject({
      balanceCents: 0,
      refundCents: 239,
    })
  })
})
