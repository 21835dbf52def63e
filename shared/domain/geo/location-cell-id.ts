import { isOnGrid, type CellSize, type LocationCell } from '@/shared/domain/geo/location-cell'

const shape = /^(50|100|200)\.(0|[1-9]\d{0,3})\.(0|[1-9]\d{0,3})$/

/** '50.2582.1910': size in thousandths of a degree, row, column. One text per cell, safe in an address. */
export function printCellId({ sizeThousandths, iy, ix }: LocationCell): string {
  return `${sizeThousandths}.${iy}.${ix}`
}

/** null: not a text that `printCellId` writes. */
export function parseCellId(text: string): LocationCell | null {
  const parts = shape.exec(text)
  if (!parts) return null
  const cell = { sizeThousandths: Number(parts[1]) as CellSize, iy: Number(parts[2]), ix: Number(parts[3]) }
  return isOnGrid(cell) ? cell : null
}
