import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { allocateRefund } from '@/shared/domain/money/allocate-refund'
import { feeAfterRefundsCents, giveBackFeeCents } from '@/shared/domain/money/give-back-fee'
import { largestRemainder } from '@/shared/domain/money/largest-remainder'
import { linePartCents, lineTotalCents, type LinePrice } from '@/shared/domain/money/line-total'
import { noShowSplit } from '@/shared/domain/money/no-show-split'
import { quoteOrder, quoteTotals } from '@/shared/domain/money/quote-order'
import { roundHalfUp } from '@/shared/domain/money/round-half-up'
import { settle } from '@/shared/domain/money/settle'
import { shortfallRefund } from '@/shared/domain/money/shortfall-refund'
import { areTiersFalling, nextTier, tierFor } from '@/shared/domain/money/tier-price'

const cents = (most = 10_000_000) => fc.integer({ min: 0, max: most })
const bp = fc.integer({ min: 0, max: 10_000 })
const count = fc.integer({ min: 1, max: 5000 })
const sum = (values: readonly number[]) => values.reduce((total, value) => total + value, 0)
const price: fc.Arbitrary<LinePrice> = fc.oneof(
  fc.record({ kind: fc.constant('each' as const), unitCents: cents(100_000) }),
  fc.record({ kind: fc.constant('pack' as const), packCents: cents(100_000), packCount: count }),
  fc.record({ kind: fc.constant('weight' as const), centsPerLb: cents(100_000) }),
)

describe('rounding', () => {
  it('is half up, checked against big integers', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 0, max: 2 ** 52 }),
        fc.integer({ min: 1, max: 2 ** 40 }),
        (above, below) => {
          const exact = (2n * BigInt(above) + BigInt(below)) / (2n * BigInt(below))
          expect(BigInt(roundHalfUp(above, below))).toBe(exact)
        },
      ),
    )
  })

  it.each([
    [-1, 2],
    [1, 0],
    [0.5, 2],
    [Number.NaN, 1],
    [2 ** 54, 3],
  ])('refuses %d / %d', (above, below) => expect(() => roundHalfUp(above, below)).toThrow(RangeError))
})

describe('lines and tiers', () => {
  it('adds up however a line is cut', () => {
    fc.assert(
      fc.property(price, fc.array(fc.integer({ min: 0, max: 500 }), { maxLength: 12 }), (how, cuts) => {
        let at = 0
        const parts = cuts.map((step) => linePartCents(how, { from: at, to: (at += step) }))
        expect(sum(parts)).toBe(lineTotalCents(how, at))
        expect(parts.every((part) => part >= 0)).toBe(true)
      }),
    )
  })

  it('keeps 25 for $34.99 a pack price', () => {
    const pack = { kind: 'pack', packCents: 3499, packCount: 25 } as const
    expect([lineTotalCents(pack, 25), lineTotalCents(pack, 24), lineTotalCents(pack, 50)]).toEqual([
      3499, 3359, 6998,
    ])
    expect(lineTotalCents({ kind: 'weight', centsPerLb: 350 }, 127)).toBe(445)
  })

  it('buys at the tier reached and tells how many are missing to the next', () => {
    const tiers = [
      { fromCount: 25, unitCents: 100 },
      { fromCount: 100, unitCents: 80 },
    ]
    expect(tierFor(tiers, 24)).toBeNull()
    expect([
      tierFor(tiers, 25)?.unitCents,
      tierFor(tiers, 99)?.unitCents,
      tierFor(tiers, 100)?.unitCents,
    ]).toEqual([100, 100, 80])
    expect(nextTier(tiers, 60)).toEqual({ fromCount: 100, unitCents: 80, missing: 40 })
    expect(nextTier(tiers, 100)).toBeNull()
  })

  it('wants the price to fall as the count grows', () => {
    const tiers = (second: number) => [
      { fromCount: 25, unitCents: 100 },
      { fromCount: 100, unitCents: second },
    ]
    expect([areTiersFalling(tiers(99)), areTiersFalling(tiers(100)), areTiersFalling(tiers(105))]).toEqual([
      true,
      false,
      false,
    ])
  })

  it('has no price below the first tier', () => {
    const terms = { boxCents: 0, freightCents: 0, taxCents: 0, depositBp: 2500, feeBp: 600 }
    expect(() => quoteOrder({ ...terms, tiers: [{ fromCount: 25, unitCents: 100 }], quantity: 20 })).toThrow(
      RangeError,
    )
  })
})

describe('totals', () => {
  const order = fc.record({
    goods: cents(),
    terms: fc.record({
      boxCents: cents(10_000),
      freightCents: cents(50_000),
      taxCents: cents(100_000),
      depositBp: bp,
      feeBp: fc.integer({ min: 0, max: 3000 }),
    }),
  })

  it('balance is total less deposit; the deposit stays between a dollar and the goods; nothing is negative', () => {
    fc.assert(
      fc.property(order, ({ goods, terms }) => {
        const totals = quoteTotals(goods, terms)
        expect(totals.depositCents + totals.balanceCents).toBe(totals.totalCents)
        expect(totals.totalCents).toBe(goods + terms.boxCents + terms.freightCents + terms.taxCents)
        expect(totals.depositCents).toBeLessThanOrEqual(goods)
        expect(totals.depositCents).toBeGreaterThanOrEqual(Math.min(100, goods))
        expect(totals.feeCents).toBeLessThanOrEqual(goods)
        expect(Math.min(...Object.values(totals))).toBeGreaterThanOrEqual(0)
      }),
    )
  })

  it('a settlement accounts for every cent that was charged', () => {
    const case_ = fc.record({ order, refundBp: bp, debt: cents(20_000), givesFreight: fc.boolean() })
    fc.assert(
      fc.property(case_, ({ order: { goods, terms }, refundBp, debt, givesFreight }) => {
        const totals = quoteTotals(goods, terms)
        const refundedGoodsCents = roundHalfUp(goods * refundBp, 10_000)
        const settled = settle({
          chargedCents: totals.totalCents,
          goodsCents: goods,
          taxCents: terms.taxCents,
          refundedGoodsCents,
          refundedOtherCents: givesFreight ? terms.boxCents + terms.freightCents : 0,
          feeBp: terms.feeBp,
          debtCents: debt,
        })
        expect(sum(Object.values(settled))).toBe(totals.totalCents)
        expect(Math.min(...Object.values(settled))).toBeGreaterThanOrEqual(0)
        expect(settled.debtRecoveredCents).toBeLessThanOrEqual(debt)
      }),
    )
  })

  it('refuses to settle an order that gave away more than it took', () => {
    const order = { chargedCents: 100, goodsCents: 100, taxCents: 0, feeBp: 0, debtCents: 0 }
    expect(() => settle({ ...order, refundedGoodsCents: 100, refundedOtherCents: 1 })).toThrow(RangeError)
  })
})

describe('refunds', () => {
  it('gives the same fee back however the refunds are cut', () => {
    const cuts = fc.array(cents(100_000), { minLength: 1, maxLength: 20 })
    fc.assert(
      fc.property(cuts, bp, (refunds, feeBp) => {
        const goodsCents = sum(refunds)
        let refundedBeforeCents = 0
        const backs = refunds.map((refundCents) => {
          const back = giveBackFeeCents({ goodsCents, refundedBeforeCents, refundCents, feeBp })
          refundedBeforeCents += refundCents
          return back
        })
        expect(sum(backs)).toBe(feeAfterRefundsCents(goodsCents, 0, feeBp))
        expect(Math.min(...backs)).toBeGreaterThanOrEqual(0)
      }),
    )
  })

  it('splits to the cent, and nobody is more than a cent from their exact share', () => {
    const weights = fc
      .array(fc.integer({ min: 0, max: 100_000 }), { minLength: 1, maxLength: 30 })
      .filter((list) => sum(list) > 0)
    fc.assert(
      fc.property(cents(), weights, (total, list) => {
        const shares = largestRemainder(total, list)
        expect(sum(shares)).toBe(total)
        shares.forEach((share, at) => {
          expect(Math.abs(share - (total * (list[at] ?? 0)) / sum(list))).toBeLessThan(1)
        })
      }),
    )
    expect(largestRemainder(2, [1, 1, 1])).toEqual([1, 1, 0])
    expect(() => largestRemainder(2, [0, 0])).toThrow(RangeError)
  })

  it('never refunds more than the goods for a shortfall, nothing for an overcount, and freight below half', () => {
    const arrival = fc.record({ ordered: count, alive: fc.integer({ min: 0, max: 6000 }), price })
    fc.assert(
      fc.property(arrival, (given) => {
        const costs = { boxCents: 1200, freightCents: 4850, isSellersFault: false, promisesFreight: false }
        const back = shortfallRefund({ ...given, ...costs })
        expect(back.shortfall).toBe(Math.max(0, given.ordered - given.alive))
        expect(back.goodsCents).toBeLessThanOrEqual(lineTotalCents(given.price, given.ordered))
        expect(back.boxAndFreightCents).toBe(given.alive < given.ordered / 2 ? 6050 : 0)
        expect(back.refundCents).toBe(back.goodsCents + back.boxAndFreightCents)
        const faulty = shortfallRefund({ ...given, ...costs, isSellersFault: true })
        expect(faulty.boxAndFreightCents).toBe(back.shortfall > 0 ? 6050 : 0)
      }),
    )
  })

  it('keeps no more than the deposit of a no-show', () => {
    fc.assert(
      fc.property(cents(), cents(), bp, (chargedCents, depositCents, feeBp) => {
        const split = noShowSplit({ chargedCents, depositCents, feeBp })
        expect(split.keptCents).toBeLessThanOrEqual(depositCents)
        expect(split.keptCents + split.refundCents).toBe(chargedCents)
        expect(split.feeCents + split.sellerCents).toBe(split.keptCents)
        expect(Math.min(...Object.values(split))).toBeGreaterThanOrEqual(0)
      }),
    )
  })

  it('sends back to each card charge no more than it still holds', () => {
    const charge = fc.record({
      id: fc.uuid(),
      purpose: fc.constantFrom('deposit' as const, 'balance' as const),
      chargedCents: cents(50_000),
    })
    fc.assert(
      fc.property(fc.array(charge, { maxLength: 3 }), cents(120_000), (list, wanted) => {
        const charges = list.map((one) => ({ ...one, refundedCents: Math.floor(one.chargedCents / 3) }))
        const rest = (id: string) =>
          sum(charges.filter((c) => c.id === id).map((c) => c.chargedCents - c.refundedCents))
        const parts = allocateRefund(wanted, charges)
        if (parts === null)
          expect(wanted).toBeGreaterThan(sum(charges.map((c) => c.chargedCents - c.refundedCents)))
        else {
          expect(sum(parts.map((part) => part.cents))).toBe(wanted)
          for (const part of parts) expect(part.cents).toBeLessThanOrEqual(rest(part.id))
        }
      }),
    )
  })
})
