import type { SourceKey } from '@/shared/sources'

interface CatfishRow {
  inches: number
  lbPer1000: number
  fishPerLb: number
}

export const catfishTableSource: SourceKey = 'alabama-catfish'

/**
 * Channel catfish fingerlings by total length. The printed 1 in row says 1,500 per lb, though 0.7 lb per 1,000 is 1,430.
 * The worked example printed beside the table disagrees with it; the table is what we use.
 */
export const catfishTable: readonly CatfishRow[] = [
  { inches: 1, lbPer1000: 0.7, fishPerLb: 1500 },
  { inches: 2, lbPer1000: 3.5, fishPerLb: 286 },
  { inches: 3, lbPer1000: 10, fishPerLb: 100 },
  { inches: 4, lbPer1000: 20, fishPerLb: 50 },
  { inches: 5, lbPer1000: 32, fishPerLb: 31 },
  { inches: 6, lbPer1000: 60, fishPerLb: 17 },
  { inches: 7, lbPer1000: 93, fishPerLb: 11 },
  { inches: 8, lbPer1000: 112, fishPerLb: 9 },
  { inches: 9, lbPer1000: 180, fishPerLb: 5.5 },
  { inches: 10, lbPer1000: 328, fishPerLb: 3.1 },
]
