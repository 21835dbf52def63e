import { describe, expect, it } from 'vitest'

import { fedCatfishOxygenDemandMgPerKgHour } from '@/shared/domain/animals/fed-catfish-oxygen-demand'
import {
  catfishTableMassG,
  fultonMassG,
  massForLoadG,
  standardWeightG,
} from '@/shared/domain/animals/length-to-mass'
import { oxygenDemandMgPerKgHour } from '@/shared/domain/animals/oxygen-demand'
import { oxygenModels, type OxygenModelId } from '@/shared/domain/animals/oxygen-models.facts'
import { packedOxygenDemandMgPerKgHour } from '@/shared/domain/animals/packed-oxygen-demand'
import { salmonidOxygenDemandMgPerKgHour } from '@/shared/domain/animals/salmonid-oxygen-demand'
import { countOfLot, meanMassOfSamplesG } from '@/shared/domain/animals/sample-count'
import { findSpecies } from '@/shared/domain/species/find-species'
import { speciesFacts } from '@/shared/domain/species/species.facts'

const models = Object.keys(oxygenModels) as OxygenModelId[]

describe('oxygen use', () => {
  it('is less per kg the larger the animal, in every model', () => {
    for (const model of models) {
      const small = oxygenDemandMgPerKgHour({ model, massG: 1, waterC: 15 }) ?? 0
      expect(oxygenDemandMgPerKgHour({ model, massG: 20, waterC: 15 })).toBeLessThan(small)
    }
  })

  it('is refused where the animal dies and outside the range', () => {
    expect(oxygenDemandMgPerKgHour({ model: 'trout-adult', massG: 5, waterC: 26 })).toBeNull()
    expect(packedOxygenDemandMgPerKgHour({ model: 'trout-adult', massG: 5, waterC: 26 })).toBeNull()
    expect(oxygenDemandMgPerKgHour({ model: 'roach', massG: 0, waterC: 15 })).toBeNull()
    expect(oxygenDemandMgPerKgHour({ model: 'roach', massG: 5, waterC: 41 })).toBeNull()
    expect(salmonidOxygenDemandMgPerKgHour(100, 25)).toBeNull()
    expect(fedCatfishOxygenDemandMgPerKgHour(100, 5)).toBeNull()
  })

  it('never falls with warmth when a trip is planned', () => {
    for (const model of models) {
      let before = 0
      for (let waterC = 1; waterC < 40; waterC += 0.5) {
        const now = packedOxygenDemandMgPerKgHour({ model, massG: 3, waterC })
        if (now === null) break
        expect(now).toBeGreaterThanOrEqual(before)
        before = now
      }
      expect(before).toBeGreaterThan(0)
    }
  })

  it('takes half as much again for packed fish, unless the model swims already', () => {
    const at = { massG: 2, waterC: 18 }
    for (const model of models) {
      const packed = packedOxygenDemandMgPerKgHour({ model, ...at }) ?? 0
      const resting = oxygenDemandMgPerKgHour({ model, ...at }) ?? 0
      if (!('bestC' in oxygenModels[model] && oxygenModels[model].bestC < at.waterC)) {
        expect(packed / resting).toBeCloseTo(oxygenModels[model].activity > 1 ? 1 : 1.5, 10)
      }
    }
  })
})

describe('length and mass', () => {
  it('gives every fish a mass, no crustacean and no worm', () => {
    for (const species of speciesFacts) {
      const mass = massForLoadG(species, 60)
      expect(mass !== null).toBe(species.kind === 'fish')
    }
  })

  it('plans catfish by the table, the heaviest of what is known', () => {
    const catfish = findSpecies('channel_catfish')
    expect(catfish && massForLoadG(catfish, 101.6)).toBeCloseTo(9.07, 2)
    expect(catfishTableMassG(3.5)).toBeGreaterThan(catfishTableMassG(3) ?? 0)
    expect(catfishTableMassG(0.9)).toBeNull()
    expect(catfishTableMassG(11)).toBeNull()
  })

  it('does not stretch a standard weight past its lengths', () => {
    const bluegill = findSpecies('bluegill')?.standardWeight
    expect(bluegill && standardWeightG(bluegill, 79)).toBeNull()
    expect(fultonMassG(1.5, 0)).toBeNull()
  })

  it('counts a lot by its sample', () => {
    expect(countOfLot([{ count: 10, massG: 20 }], 200)).toBe(100)
    expect(meanMassOfSamplesG([])).toBeNull()
    expect(countOfLot([{ count: 0, massG: 20 }], 200)).toBeNull()
  })
})
