import type { SourceKey } from '@/shared/sources'

export type BagStage = 'eggs' | 'yolk-sac-fry' | 'swim-up-fry' | 'fingerling'

/** Hours of the table's columns; nothing is known beyond the last. */
export const bagTableHours = [1, 12, 24, 48] as const
export const bagTableWaterF = 65
export const bagTableSource: SourceKey = 'dupree-huner-1984'

interface BagRow {
  /** lb of animals per US gal of water, low and high end, by column. */
  low: readonly [number, number, number, number]
  high: readonly [number, number, number, number]
}

// Bag with oxygen over water of 65 °F. We plan by the low end: the high end fails the oxygen balance for small tilapia
// and passes 1,000 mg/L of CO2.
// prettier-ignore
export const bagTable: Readonly<Record<BagStage, BagRow>> = {
  'eggs': { low: [0.5, 0.5, 0.5, 0.2], high: [1.5, 1.2, 1.0, 0.5] },
  'yolk-sac-fry': { low: [1.0, 0.7, 0.4, 0.1], high: [3.0, 2.5, 2.0, 1.0] },
  'swim-up-fry': { low: [0.5, 0.4, 0.4, 0.2], high: [2.0, 1.6, 1.2, 0.6] },
  'fingerling': { low: [1.0, 0.9, 0.7, 0.3], high: [3.7, 3.2, 2.7, 1.3] },
}
