import { describe, expect, it } from 'vitest'

import { figures } from '@/components/forms/figure'

describe('reading figures as they are typed', () => {
  it('takes lengths in inches and centimetres and keeps them in quarter inches', () => {
    expect(figures.batchLengthMm.read('2 1/4 in', 'us')).toBe(57.15)
    expect(figures.batchLengthMm.read('2¼', 'us')).toBe(57.15)
    expect(figures.batchLengthMm.read('6 cm', 'us')).toBe(57.15)
    expect(figures.batchLengthMm.read('6', 'metric')).toBe(57.15)
    expect(figures.batchLengthMm.read('two', 'us')).toBeNull()
  })

  it('prints a quarter-inch length so that it reads back as the same one, in both systems', () => {
    for (let quarters = 1; quarters <= 240; quarters++) {
      const mm = Number((quarters * 6.35).toFixed(2))
      for (const units of ['us', 'metric'] as const) {
        const text = figures.batchLengthMm.print(mm, units)
        expect(figures.batchLengthMm.read(text, units), text).toBe(mm)
      }
    }
  })

  it('takes prices, counts and temperatures with or without their signs', () => {
    expect(figures.cents.read('$0.89')).toBe(89)
    expect(figures.count.read('2,000')).toBe(2000)
    expect(figures.temperatureC.read('22 C', 'us')).toBe(22)
    expect(figures.temperatureC.read('71.6 F', 'metric')).toBeCloseTo(22, 6)
  })

  it('takes water figures with the unit people write behind them', () => {
    expect(figures.ppm.read('120 ppm')).toBe(120)
    expect(figures.ppm.read('120 mg/L')).toBe(120)
    expect(figures.saltPpt.read('1.5 ppt')).toBe(1.5)
    expect(figures.percent.read('25 %')).toBe(25)
    expect(figures.pH.read('7.4')).toBe(7.4)
    expect(figures.pH.read('7.4 in')).toBeNull()
  })
})
