import { describe, expect, it } from 'vitest'

import { quoteOrder } from '@/shared/domain/money/quote-order'
import { boxCharges } from '@/shared/domain/shipping/box-charges'
import { FORECAST_MARGIN_C, forecastWeather } from '@/shared/domain/shipping/forecast-weather'
import { silenceMoves } from '@/shared/domain/shipping/hold-rules'
import { worstAir } from '@/shared/domain/shipping/worst-air'
import type { Reason } from '@/shared/domain/transport/verdict'

const DAY_MS = 86_400_000

describe('what boxes cost', () => {
  const terms = { boxCents: 1200, freightCents: 4850, mostInBox: 60 }

  it('comes to the worked example: 60 fish at $0.89 in one box', () => {
    const charges = boxCharges(60, terms)
    expect(charges).toEqual({ boxes: 1, boxCents: 1200, freightCents: 4850 })
    const tiers = [{ fromCount: 25, unitCents: 89 }]
    const quote = quoteOrder({ tiers, quantity: 60, ...charges, taxCents: 0, depositBp: 2500, feeBp: 600 })
    expect(quote).toMatchObject({
      goodsCents: 5340,
      totalCents: 11_390,
      depositCents: 1335,
      balanceCents: 10_055,
    })
  })

  it('opens another box for one animal more, and is never asked for none', () => {
    expect(boxCharges(61, terms)).toEqual({ boxes: 2, boxCents: 2400, freightCents: 9700 })
    expect(() => boxCharges(0, terms)).toThrow(RangeError)
    expect(() => boxCharges(5, { ...terms, mostInBox: 0 })).toThrow(RangeError)
  })
})

describe('weather by the forecast', () => {
  it('takes the coldest night and noon and the warmest, with the margin on the side that harms', () => {
    const days = [
      { minC: 4, maxC: 15 },
      { minC: 1, maxC: 19 },
    ]
    expect(forecastWeather(days)).toEqual({
      cold: { minC: 1 - FORECAST_MARGIN_C, maxC: 15 - FORECAST_MARGIN_C },
      hot: { minC: 4 + FORECAST_MARGIN_C, maxC: 19 + FORECAST_MARGIN_C },
    })
    expect(forecastWeather([])).toBeNull()
  })
})

describe('the worst air of a way', () => {
  const day = (minC: number, maxC: number) => ({ cold: { minC, maxC }, hot: { minC, maxC } })
  const weather = { origin: day(-3, 9), destination: day(-8, 12) }
  const because = (code: Reason['code']): Reason => ({
    ...{ code, verdict: 'unsafe', value: null, limit: null, atHour: null, sourceKey: 'house-rule' },
  })

  it('names the colder end for cold and the warmer for heat', () => {
    expect(worstAir(weather, [because('too-cold')])).toEqual({ side: 'cold', end: 'destination', airC: -8 })
    expect(worstAir(weather, [because('too-warm')])).toEqual({ side: 'hot', end: 'destination', airC: 12 })
  })

  it('blames no weather for a bag that is too full', () => {
    expect(worstAir(weather, [because('bag-too-full')])).toBeNull()
  })
})

describe('whether silence may move a day (16 CFR 435.2(b))', () => {
  const first = { number: 1, fromMs: DAY_MS, heldMs: 0, proposedMs: 7 * DAY_MS }

  it('does for a first hold of six days, and of thirty', () => {
    expect(silenceMoves(first)).toBe(true)
    expect(silenceMoves({ ...first, proposedMs: 31 * DAY_MS })).toBe(true)
  })

  it('does not past thirty days, the second time, or without a day', () => {
    expect(silenceMoves({ ...first, proposedMs: 31 * DAY_MS + 1 })).toBe(false)
    expect(silenceMoves({ ...first, number: 2 })).toBe(false)
    expect(silenceMoves({ ...first, proposedMs: null })).toBe(false)
  })

  it('does not to a day that begins before the time to answer is over', () => {
    expect(silenceMoves({ ...first, proposedMs: 3 * DAY_MS - 1 })).toBe(false)
    expect(silenceMoves({ ...first, proposedMs: 3 * DAY_MS })).toBe(true)
  })
})
