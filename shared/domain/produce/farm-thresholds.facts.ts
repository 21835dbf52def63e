import type { SourceKey } from '@/shared/sources'

export interface FarmThreshold {
  id: 'not-covered' | 'qualified-exempt' | 'organic-exempt'
  /** The sum as the text of the rule says it, before any adjustment, or as adjusted for the years. */
  dollars: number
  years: string
  of: string
  sourceKey: SourceKey
}

// Newest last. The agency posts new sums each spring: add a row, never change one.
export const farmThresholds: readonly FarmThreshold[] = [
  {
    id: 'not-covered',
    dollars: 25_000,
    years: 'as the rule was written, before inflation',
    of: 'average yearly produce sales over three years',
    sourceKey: 'umaine-4281',
  },
  {
    id: 'not-covered',
    dollars: 26_999,
    years: '2015 to 2017',
    of: 'average yearly produce sales over three years',
    sourceKey: 'fsma-news-2018',
  },
  {
    id: 'not-covered',
    dollars: 32_100,
    years: '2021 to 2023, our own sum',
    of: 'average yearly produce sales over three years',
    sourceKey: 'fda-deflators',
  },
  {
    id: 'qualified-exempt',
    dollars: 500_000,
    years: 'as the rule was written, before inflation',
    of: 'average yearly sales of all food, more than half of it to people who eat it or to shops nearby',
    sourceKey: 'nsac-fsma',
  },
  {
    id: 'organic-exempt',
    dollars: 5000,
    years: 'not checked',
    of: 'yearly organic sales',
    sourceKey: 'memory',
  },
]

/** The newest sum we hold. */
export function newestThreshold(id: FarmThreshold['id']): FarmThreshold {
  const found = farmThresholds.findLast((row) => row.id === id)
  if (!found) throw new RangeError(`no threshold ${id}`)
  return found
}
