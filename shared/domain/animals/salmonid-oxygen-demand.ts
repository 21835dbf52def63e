import type { Equation } from '@/shared/domain/equation'
import { celsiusFromF, fahrenheitFromC } from '@/shared/units/temperature'
import { poundsFromG } from '@/shared/units/mass'

export const salmonidOxygenEquation: Equation = {
  text: 'O = K · T^n · W^m, lb O2 per 100 lb of trout and day, T in °F, W in lb',
  validFor:
    'trout of 0.005 to 5 lb, 40 to 65 °F; K 1.90e-6, n 3.130 to 50 °F, K 3.05e-4, n 1.855 above; m −0.138',
  sourceKeys: ['liao-1971'],
}

/** Oxygen use of fed trout, mg O2 per kg and hour: Liao 1971 (from memory). null outside 40-65 °F or 2.3-2,270 g. */
export function salmonidOxygenDemandMgPerKgHour(massG: number, waterC: number): number | null {
  const pounds = poundsFromG(massG)
  if (!(waterC >= celsiusFromF(40) && waterC <= celsiusFromF(65) && pounds >= 0.005 && pounds <= 5))
    return null
  const waterF = fahrenheitFromC(waterC)
  const warmth = waterF <= 50 ? 1.9e-6 * waterF ** 3.13 : 3.05e-4 * waterF ** 1.855
  const poundsPer100PoundDay = warmth * pounds ** -0.138
  return (poundsPer100PoundDay / 100 / 24) * 1e6
}
