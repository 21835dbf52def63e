import type { Equation } from '@/shared/domain/equation'

export const bassGrowthEquation: Equation = {
  text: 'RTGI = 1.494 − 0.301 T + 0.0204 T² − 0.000367 T³',
  validFor: 'largemouth bass of about 57 g, 9 to 33 °C; 1 is the best growth, 1.113 % a day near 26.8 °C',
  sourceKeys: ['was-166442'],
}

/** Growth of largemouth bass relative to the best temperature. null outside 9-33 °C. Rounded coefficients: peaks at 1.015. */
export function bassGrowthIndex(waterC: number): number | null {
  if (!(waterC >= 9 && waterC <= 33)) return null
  return 1.494 - 0.301 * waterC + 0.0204 * waterC ** 2 - 0.000367 * waterC ** 3
}
