import { cellAt, widenCell, type CellPoint, type LocationCell } from '@/shared/domain/geo/location-cell'

/** House rule: a seller is one of at least this many neighbours, as far as 0.2 degrees allow. */
export const fewestNeighbours = 1000

/**
 * The cell whose centre stands for a seller in everything public: 0.05°, grown to 0.1° and 0.2° while fewer than
 * `fewestNeighbours` people live in places inside it. null: not a place on Earth.
 */
export function locationCellForSeller(
  point: CellPoint,
  populationOf: (cell: LocationCell) => number,
): LocationCell | null {
  const small = cellAt(point, 50)
  if (!small || populationOf(small) >= fewestNeighbours) return small
  const middle = widenCell(small, 100)
  return populationOf(middle) >= fewestNeighbours ? middle : widenCell(small, 200)
}
