import type { Equation } from '@/shared/domain/equation'

export const fedCatfishOxygenEquation: Equation = {
  text: 'log10(mg O2/g/h) = −0.999 − 0.000957 W + 6e-7 W² + 0.0327 T − 8.7e-6 T² + 3e-7 T³',
  validFor: 'fed channel catfish of 2 to 1,000 g, 15 to 32 °C',
  sourceKeys: ['boyd-1978'],
}

/** Oxygen use of fed channel catfish, mg O2 per kg and hour: Boyd et al. 1978 (from memory). null out of range. */
export function fedCatfishOxygenDemandMgPerKgHour(massG: number, waterC: number): number | null {
  if (!(massG >= 2 && massG <= 1000 && waterC >= 15 && waterC <= 32)) return null
  const mass = -0.000957 * massG + 6e-7 * massG ** 2
  const warmth = 0.0327 * waterC - 8.7e-6 * waterC ** 2 + 3e-7 * waterC ** 3
  return 10 ** (-0.999 + mass + warmth) * 1000
}
