import { describe, expect, it } from 'vitest'

import type { SearchRow } from '@/server/search/search-row'
import { tierColumns, unitCentsAt } from '@/server/search/tier-columns'

const tiers = [
  { fromCount: 25, unitCents: 100 },
  { fromCount: 100, unitCents: 80 },
  { fromCount: 500, unitCents: 60 },
]

const rowWith = (more: Partial<SearchRow>): SearchRow => ({
  listingId: 1,
  sellerId: 1,
  categoryCode: 1,
  speciesCode: 3,
  place: { lat: 39.125, lng: -84.525 },
  qty: 2000,
  minQty: 25,
  tiers,
  sizeLoMm: 50,
  sizeHiMm: 75,
  nextDay: 2571,
  lastDay: 2571,
  openDays: 1n << 11n,
  pickup: true,
  lane: 0,
  shipStates: 0n,
  hiddenStates: 0n,
  ratingRank: 80,
  rev: 1,
  ...more,
})

describe('prices in the search table', () => {
  it.each([
    [20, 100],
    [25, 100],
    [99, 100],
    [100, 80],
    [499, 80],
    [500, 60],
    [9000, 60],
  ])('for %i fish one costs %i cents', (count, cents) => expect(unitCentsAt(tiers, count)).toBe(cents))

  it('leaves what is not used at a count nobody orders', () => {
    expect(tierColumns(rowWith({}))).toMatchObject({
      price1: 100,
      from3: 500,
      price3: 60,
      from4: 16_777_215,
      moreTiers: '',
    })
  })

  it('writes the fifth to eighth price as digits', () => {
    const six = [25, 50, 100, 200, 400, 800].map((fromCount, at) => ({ fromCount, unitCents: 100 - at * 10 }))
    expect(tierColumns(rowWith({ tiers: six })).moreTiers).toBe(
      '000040000000060' + '000080000000050' + '999999900000000' + '999999900000000',
    )
  })

  it('knows the least an everyday order can cost: up to 99 fish, or the smallest order if that is more', () => {
    expect(tierColumns(rowWith({})).smallPrice).toBe(100)
    expect(tierColumns(rowWith({ minQty: 250 })).smallPrice).toBe(80)
    expect(
      tierColumns(
        rowWith({
          categoryCode: 4,
          minQty: 1,
          tiers: [
            { fromCount: 1, unitCents: 300 },
            { fromCount: 6, unitCents: 250 },
            { fromCount: 10, unitCents: 200 },
          ],
        }),
      ).smallPrice,
    ).toBe(300)
  })

  it('refuses a listing without a price or with a ninth', () => {
    expect(() => tierColumns(rowWith({ tiers: [] }))).toThrow(RangeError)
    const nine = Array.from({ length: 9 }, (_, at) => ({ fromCount: at + 1, unitCents: 100 - at }))
    expect(() => tierColumns(rowWith({ tiers: nine }))).toThrow(RangeError)
  })
})
