import { oxygenDemandMgPerKgHour } from '@/shared/domain/animals/oxygen-demand'
import { oxygenModels, type OxygenModelId } from '@/shared/domain/animals/oxygen-models.facts'
import type { SourceKey } from '@/shared/sources'

/** House rule: netted, counted and packed fish use half as much again as resting ones. */
const STRESS_FACTOR = 1.5
export const stressSource: SourceKey = 'house-rule'

interface Animal {
  model: OxygenModelId
  massG: number
  waterC: number
}

/**
 * Oxygen use to plan a trip by, mg O2 per kg and hour. Beyond its peak a model falls because the animal is dying; there
 * the peak counts. Models that hold swimming already take no stress factor. null as `oxygenDemandMgPerKgHour`.
 */
export function packedOxygenDemandMgPerKgHour({ model, massG, waterC }: Animal): number | null {
  const row = oxygenModels[model]
  const countedC = row.equation === 2 && waterC < row.mostC ? Math.min(waterC, row.bestC) : waterC
  const resting = oxygenDemandMgPerKgHour({ model, massG, waterC: countedC })
  return resting && resting * (row.activity > 1 ? 1 : STRESS_FACTOR)
}
