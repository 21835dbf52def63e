import { describe, expect, it } from 'vitest'

import { bassGrowthIndex } from '@/shared/domain/growth/bass-growth-index'
import { daysOfDegreeDays } from '@/shared/domain/growth/degree-days'
import { forecastGrowth } from '@/shared/domain/growth/forecast-growth'
import { growingWarmthC } from '@/shared/domain/growth/growing-warmth'
import { massAfterG, specificGrowthPercentPerDay, tgcX1000Of } from '@/shared/domain/growth/thermal-growth'
import { troutCmPerMonth } from '@/shared/domain/growth/trout-length-growth'
import { findSpecies } from '@/shared/domain/species/find-species'
import { speciesFacts } from '@/shared/domain/species/species.facts'

const tilapia = findSpecies('nile_tilapia')
if (!tilapia) throw new Error('Nile tilapia has left the species facts')

describe('growth', () => {
  it('gives back the coefficient it grew by', () => {
    const toG = massAfterG({ massG: 5, tgcX1000: 1.1, waterC: 27, days: 60 }) ?? 0
    expect(tgcX1000Of({ fromG: 5, toG, degreeDaysC: 27 * 60 })).toBeCloseTo(1.1, 10)
  })

  it('stops below feeding, levels off at the optimum and is not foretold in heat', () => {
    expect(growingWarmthC(tilapia, 12)).toBe(0)
    expect(growingWarmthC(tilapia, 25)).toBe(25)
    expect(growingWarmthC(tilapia, 33)).toBe(30)
    expect(growingWarmthC(tilapia, 36)).toBeNull()
  })

  it('forecasts a range, never an animal that shrinks', () => {
    const size = forecastGrowth({ species: tilapia, massG: 2, lengthMm: 50, waterC: 28, days: 30 })
    expect(size?.fast.massG).toBeGreaterThan(size?.slow.massG ?? 0)
    expect(size?.slow.lengthMm).toBeGreaterThan(50)
    const cold = forecastGrowth({ species: tilapia, massG: 2, lengthMm: 50, waterC: 10, days: 30 })
    expect(cold?.fast.massG).toBeCloseTo(2, 10)
  })

  it('says nothing without a coefficient or outside a range', () => {
    for (const species of speciesFacts.filter(({ tgcX1000 }) => tgcX1000 === null)) {
      expect(forecastGrowth({ species, massG: 1, lengthMm: 30, waterC: 20, days: 10 })).toBeNull()
    }
    expect(massAfterG({ massG: 0, tgcX1000: 1, waterC: 20, days: 10 })).toBeNull()
    expect(specificGrowthPercentPerDay(1, 2, 0)).toBeNull()
    expect(bassGrowthIndex(34)).toBeNull()
    expect(troutCmPerMonth(3)).toBeNull()
    expect(daysOfDegreeDays([270, 355], 0)).toBeNull()
  })
})
