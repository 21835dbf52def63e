import type { Equation } from '@/shared/domain/equation'

export const iceEquation: Equation = {
  text: 'T = (mw · 4.186 · T0 − mi · 334) / ((mw + mi) · 4.186), kg and °C',
  validFor: 'ice of 0 °C that melts wholly in the water',
  sourceKeys: ['lsu-cocahoe', 'memory'],
}

/** Water after the ice has melted in it, °C. null where the ice would not melt wholly, or a figure is out of range. */
export function waterAfterIceC(waterKg: number, iceKg: number, startC: number): number | null {
  if (!(waterKg > 0 && iceKg >= 0 && startC >= 0 && startC <= 45)) return null
  const waterC = (waterKg * 4.186 * startC - iceKg * 334) / ((waterKg + iceKg) * 4.186)
  return waterC >= 0 ? waterC : null
}
