import type { Equation } from '@/shared/domain/equation'

export const thermalGrowthEquation: Equation = {
  text: 'TGC · 1000 = 1000 · (W2^⅓ − W1^⅓) / (days · °C); W2 = (W1^⅓ + TGC/1000 · days · °C)³',
  validFor:
    'only where growth rises with temperature; hold the temperature at the optimum and count nothing below feeding',
  sourceKeys: ['iwama-tautz-1981', 'jobling-2003', 'aquasearch-tgc'],
}

interface Forecast {
  massG: number
  tgcX1000: number
  waterC: number
  days: number
}

/** Mass after `days` at one temperature, g. null for a mass not above zero, TGC outside 0-5, 0-40 °C, 0-3,650 days. */
export function massAfterG({ massG, tgcX1000, waterC, days }: Forecast): number | null {
  const holds =
    massG > 0 &&
    massG <= 1e5 &&
    tgcX1000 >= 0 &&
    tgcX1000 <= 5 &&
    waterC >= 0 &&
    waterC <= 40 &&
    days >= 0 &&
    days <= 3650
  return holds ? (Math.cbrt(massG) + (tgcX1000 / 1000) * waterC * days) ** 3 : null
}

interface Observed {
  fromG: number
  toG: number
  degreeDaysC: number
}

/** Thermal growth coefficient × 1000 of a span that was weighed. null for masses or warmth not above zero. */
export function tgcX1000Of({ fromG, toG, degreeDaysC }: Observed): number | null {
  if (!(fromG > 0 && toG > 0 && degreeDaysC > 0)) return null
  return (1000 * (Math.cbrt(toG) - Math.cbrt(fromG))) / degreeDaysC
}

/** Length after growing, in the unit it came in: L grows with the cube root of the mass. null for what is not above zero. */
export function lengthAfter(length: number, fromG: number, toG: number): number | null {
  return length > 0 && fromG > 0 && toG > 0 ? length * Math.cbrt(toG / fromG) : null
}

/** Specific growth rate, % per day. null for masses or days not above zero. */
export function specificGrowthPercentPerDay(fromG: number, toG: number, days: number): number | null {
  return fromG > 0 && toG > 0 && days > 0 ? (100 * Math.log(toG / fromG)) / days : null
}
