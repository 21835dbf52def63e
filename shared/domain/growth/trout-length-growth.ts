import type { SourceKey } from '@/shared/sources'

/** Monthly temperature units per cm, rainbow trout, mean over 7-19 °C (5.8 at 13 °C). */
const UNITS_PER_CM = 7.1
export const troutLengthGrowthSource: SourceKey = 'dwyer-1981'

/** Growth of rainbow trout in length, cm per month, at one temperature. null outside 7-19 °C. */
export function troutCmPerMonth(waterC: number): number | null {
  return waterC >= 7 && waterC <= 19 ? waterC / UNITS_PER_CM : null
}
