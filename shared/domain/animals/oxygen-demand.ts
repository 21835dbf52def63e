import {
  oxygenModels,
  type OxygenModelId,
  type OxygenModelRow,
} from '@/shared/domain/animals/oxygen-models.facts'
import type { Equation } from '@/shared/domain/equation'

export const oxygenDemandEquation: Equation = {
  text: 'R = RA · W^RB · f(T) · activity, g O2 per g and day; f(T) by equation 1 or 2 of the parameter table',
  validFor: '0.05 g to 5 kg, 0 to 40 °C and below the temperature that kills; fasted fish at rest',
  sourceKeys: ['fb4-2017'],
}

interface Animal {
  model: OxygenModelId
  massG: number
  waterC: number
}

/**
 * Oxygen use of fasted, resting animals, mg O2 per kg and hour: Fish Bioenergetics 4.0, as published, no stress factor.
 * null below 0.05 g, above 5 kg, outside 0-40 °C, or where the model says the animal dies.
 */
export function oxygenDemandMgPerKgHour({ model, massG, waterC }: Animal): number | null {
  if (!(massG >= 0.05 && massG <= 5000 && waterC >= 0 && waterC <= 40)) return null
  const row = oxygenModels[model]
  const warmth = warmthFactor(row, waterC)
  return warmth && (row.ra * massG ** row.rb * warmth * row.activity * 1e6) / 24
}

/** f(T): 1 at 0 °C in equation 1, 1 at the best temperature in equation 2. null where the animal dies. */
function warmthFactor(row: OxygenModelRow, waterC: number): number | null {
  if (row.equation === 1) return Math.exp(row.rq * waterC)
  if (waterC >= row.mostC) return null
  // Names V, X, Y, Z as in the source.
  const span = row.mostC - row.bestC
  const z = Math.log(row.rq) * span
  const y = Math.log(row.rq) * (span + 2)
  const x = (z ** 2 * (1 + Math.sqrt(1 + 40 / y)) ** 2) / 400
  const v = (row.mostC - waterC) / span
  return v ** x * Math.exp(x * (1 - v))
}
