import { describe, expect, it } from 'vitest'

import { dailyCurve } from '@/shared/domain/climate/daily-curve'
import { monthDays } from '@/shared/domain/climate/day-of-year'
import { shippedClimate } from '@/scripts/calc/climate-commands'
import { errorOf } from './checks/check'
import { climateChecks } from './checks/climate-checks'
import { normalsChecks } from './checks/normals-checks'

describe('the climate table against published normals', () => {
  it.each(climateChecks)('$what', (check) => {
    expect(errorOf(check)).toBeLessThanOrEqual(check.within)
  })

  // 15 stations in four months, 3 Januaries twice, 18 stations in four months twice.
  it('drops none of them', () => expect(climateChecks).toHaveLength(210))

  it('errs no more on the whole than it was measured to', () => {
    const minima = climateChecks.filter(({ what }) => what.startsWith('minimum')).map(errorOf)
    // 1.28 °C mean error in Alaska, where eleven of the fifteen stations stand.
    expect(minima.reduce((sum, error) => sum + error, 0) / minima.length).toBeLessThan(1.5)
  })

  it('keeps every monthly mean in its days, everywhere', () => {
    let worst = 0
    for (const { minC } of shippedClimate().values()) {
      const days = dailyCurve(minC)
      let from = 0
      for (const [month, length] of monthDays.entries()) {
        const mean = days.slice(from, from + length).reduce((sum, day) => sum + day, 0) / length
        worst = Math.max(worst, Math.abs(mean - (minC[month] ?? NaN)))
        from += length
      }
    }
    expect(worst).toBeLessThan(0.01)
  })
})

describe('the climate table against published normals of 1991-2020', () => {
  it.each(normalsChecks)('$what', (check) => {
    expect(errorOf(check)).toBeLessThanOrEqual(check.within)
  })

  // 22 stations, nine of them in the Ohio valley, in four months, maximum and minimum.
  it('drops none of them', () => expect(normalsChecks).toHaveLength(176))

  it('errs no more on the whole than it was measured to', () => {
    const meanOf = (kind: string) => {
      const errors = normalsChecks.filter(({ what }) => what.includes(kind)).map(errorOf)
      return errors.reduce((sum, error) => sum + error, 0) / errors.length
    }
    // Measured at held-out stations: 0.8 °C for maxima and 1.0 °C for minima; airports, which these are, run 0.3 to 0.5 °C
    // warmer at night than the stations around them.
    expect(meanOf('maximum')).toBeLessThan(0.9)
    expect(meanOf('minimum')).toBeLessThan(1.3)
  })
})
