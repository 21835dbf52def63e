import { readFileSync } from 'node:fs'
import path from 'node:path'
import { z } from 'zod'

import { climateGrid, normalsAt, type ClimateGrid } from '@/shared/domain/climate/climate-grid'
import { dayOfYear } from '@/shared/domain/climate/day-of-year'
import { normalDay } from '@/shared/domain/climate/normal-day'
import { readClimateCsv } from '@/shared/domain/climate/read-climate-csv'
import { command, Refusal, type Command } from '@/scripts/calc/command'

const table = path.resolve('assets/data/climate-grid.csv')
let grid: ClimateGrid | null = null
/** Read on first use: most calculations do without. */
export function shippedClimate(): ClimateGrid {
  return (grid ??= climateGrid(readClimateCsv(readFileSync(table, 'utf8'))))
}

export const climateCommands: Record<string, Command> = {
  climate: command(
    z.strictObject({ lat: z.number(), lng: z.number(), date: z.string() }),
    'places in the United States near a weather station',
    ({ lat, lng, date }) => {
      const day = dayOfYear(date)
      if (day === null) throw new Refusal('date: give a day of the calendar as YYYY-MM-DD.')
      const normals = normalsAt(shippedClimate(), lat, lng)
      return normals && normalDay(normals, day)
    },
  ),
}
