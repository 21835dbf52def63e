import { CELL_DEG } from '@/shared/domain/season/cell-size'
import { valueOf } from '@/shared/domain/season/season-code'
import { bandRows } from '@/shared/domain/season/season-table.gen'

/**
 * Climate band of a place: one of at most 48 classes of weekly lows and highs. null: no climate known there (sea, outside
 * the US, no place on Earth).
 */
export function seasonBandAt(lat: number, lng: number): number | null {
  if (!(Math.abs(lat) <= 90 && Math.abs(lng) <= 180)) return null
  const [row, column] = [Math.floor(lat / CELL_DEG), Math.floor(lng / CELL_DEG)]
  const found = bandRows.find(
    ([at, from, codes]) => at === row && column >= from && column < from + codes.length,
  )
  return found ? valueOf(found[2], column - found[1]) : null
}
