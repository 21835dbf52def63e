import { cellAt, type CellSize } from '@/shared/domain/geo/location-cell'
import type { Town } from '@/seed/places/list-towns'

export interface CellPopulation {
  sizeThousandths: CellSize
  iy: number
  ix: number
  population: number
}

/** People of the places inside each cell that has any; a place counts where its centre lies. */
export function sumCellPopulation(towns: readonly Town[], size: CellSize): CellPopulation[] {
  const cells = new Map<string, CellPopulation>()
  for (const town of towns) {
    const cell = town.isPart || town.population === 0 ? null : cellAt(town, size)
    if (!cell) continue
    const key = `${cell.iy}.${cell.ix}`
    const sum = cells.get(key) ?? { ...cell, population: 0 }
    cells.set(key, { ...sum, population: sum.population + town.population })
  }
  return [...cells.values()].sort((one, other) => one.iy - other.iy || one.ix - other.ix)
}
