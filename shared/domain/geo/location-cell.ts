/** Cell edge in thousandths of a degree. 50 is the finest anybody's place is ever shown or sent. */
export type CellSize = 50 | 100 | 200

/** A square of a fixed grid that starts at 90° S, 180° W; `iy` and `ix` count cells of its own size. */
export interface LocationCell {
  sizeThousandths: CellSize
  iy: number
  ix: number
}

export interface CellPoint {
  lat: number
  lng: number
}

const finest = 50
const rowsOf = (size: CellSize) => 180_000 / size
const columnsOf = (size: CellSize) => 360_000 / size

/** The cell of this size a point lies in; south and west edges belong to it. null: not a place on Earth. */
export function cellAt({ lat, lng }: CellPoint, size: CellSize): LocationCell | null {
  if (!(Math.abs(lat) <= 90 && Math.abs(lng) <= 180)) return null
  // Coarse indexes come from the fine ones, so that cells nest whatever the last bits of the degrees say.
  const fineY = Math.min(fineIndex(lat + 90), rowsOf(finest) - 1)
  const fineX = Math.min(fineIndex(lng + 180), columnsOf(finest) - 1)
  const ratio = size / finest
  return { sizeThousandths: size, iy: Math.floor(fineY / ratio), ix: Math.floor(fineX / ratio) }
}

/** A buyer's place leaves the device as this cell, never as a coordinate. null: not a place on Earth. */
export function buyerCellAt(point: CellPoint): LocationCell | null {
  return cellAt(point, finest)
}

/** Centre in degrees, the only point of a cell that is ever computed with. */
export function cellCentre({ sizeThousandths: size, iy, ix }: LocationCell): CellPoint {
  return { lat: microDegrees((iy + 0.5) * size - 90_000), lng: microDegrees((ix + 0.5) * size - 180_000) }
}

/** Edges in degrees. */
export function cellBounds({ sizeThousandths: size, iy, ix }: LocationCell) {
  return {
    south: microDegrees(iy * size - 90_000),
    north: microDegrees((iy + 1) * size - 90_000),
    west: microDegrees(ix * size - 180_000),
    east: microDegrees((ix + 1) * size - 180_000),
  }
}

/** Whether the point's own cell of that size is this one. */
export function cellContains(cell: LocationCell, point: CellPoint): boolean {
  const own = cellAt(point, cell.sizeThousandths)
  return own !== null && own.iy === cell.iy && own.ix === cell.ix
}

/** The cell of a coarser size that holds this one. */
export function widenCell(cell: LocationCell, size: CellSize): LocationCell {
  if (size <= cell.sizeThousandths) return cell
  const ratio = size / cell.sizeThousandths
  return { sizeThousandths: size, iy: Math.floor(cell.iy / ratio), ix: Math.floor(cell.ix / ratio) }
}

/** Whether the indexes lie on the grid of that size. */
export function isOnGrid({ sizeThousandths: size, iy, ix }: LocationCell): boolean {
  return iy >= 0 && iy < rowsOf(size) && ix >= 0 && ix < columnsOf(size)
}

const fineIndex = (degrees: number) => Math.floor(Math.round(degrees * 1e6) / (finest * 1000))
const microDegrees = (thousandths: number) => Math.round(thousandths * 1000) / 1e6
