import { readFile } from 'node:fs/promises'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

import type { UsualAir } from '@/shared/contracts/trips'
import { climateGrid, normalsAt, type ClimateGrid } from '@/shared/domain/climate/climate-grid'
import { dayOfYear } from '@/shared/domain/climate/day-of-year'
import { normalDay } from '@/shared/domain/climate/normal-day'
import { readClimateCsv } from '@/shared/domain/climate/read-climate-csv'
import type { CellPoint } from '@/shared/domain/geo/location-cell'

const TABLE = path.join(
  path.dirname(fileURLToPath(import.meta.url)),
  ...['..', '..', 'assets', 'data', 'climate-grid.csv'],
)

let grid: Promise<ClimateGrid> | null = null

/** Read once, on first use: 0.7 MB that most requests do without. */
const shippedGrid = () => (grid ??= readFile(TABLE, 'utf8').then((text) => climateGrid(readClimateCsv(text))))

/** What the air is usually like at a place on a day (YYYY-MM-DD). null: no station near, or no such day. */
export async function usualAir({ lat, lng }: CellPoint, day: string): Promise<UsualAir | null> {
  const normals = normalsAt(await shippedGrid(), lat, lng)
  const at = dayOfYear(day)
  return normals && at !== null ? normalDay(normals, at) : null
}
