import { CELL_DEG } from '@/shared/domain/season/cell-size'
import { seasonOptionIds } from '@/shared/domain/season/season-classes.facts'
import { encodeFigures } from '@/shared/domain/season/season-code'
import { animalClassIds, packingClassIds } from '@/shared/domain/season/season-lane'
import { levelOfDay } from '@/shared/domain/season/season-scale'
import { mayServe, scaleOf, weekDays, type WeekDay } from '@/shared/domain/season/season-table'
import { cellClimates, type CellClimate } from '@/scripts/season/cell-climate'
import { BANDS, bandsOf, bandWeeks } from '@/scripts/season/climate-bands'
import { isAnswered, limitsOf } from '@/scripts/season/season-limits'

type Row = [row: number, column: number, codes: string]

/** Runs of neighbouring cells, south to north and west to east. */
function rowsOf(cells: readonly CellClimate[], bands: readonly number[]): Row[] {
  const sorted = cells
    .map(({ row, column }, at) => ({ row, column, band: bands[at] ?? 0 }))
    .sort((a, b) => a.row - b.row || a.column - b.column)
  const rows: Row[] = []
  for (const { row, column, band } of sorted) {
    const last = rows.at(-1)
    if (last && last[0] === row && last[1] + last[2].length === column) last[2] += encodeFigures([band])
    else rows.push([row, column, encodeFigures([band])])
  }
  return rows
}

/** The whole season table as the text of its module. */
export function tableText(): string {
  const cells = cellClimates()
  const bands = bandsOf(cells)
  const air = bandWeeks(cells, bands)
  const weeks = (day: WeekDay, nights: number) =>
    air.map((band) =>
      encodeFigures((band[nights - 1] ?? []).map((week) => levelOfDay(scaleOf[day], week[day]))),
    )
  const limits = animalClassIds.flatMap((animals) =>
    packingClassIds.flatMap((packing) => {
      if (!isAnswered({ animals, packing, option: 'none-middle' })) return []
      const byOption = seasonOptionIds.map((option) => {
        const served = weekDays.filter((day) => mayServe(option, day))
        const byDay = served.map((day) => [day, encodeFigures(limitsOf({ animals, packing, option }, day))])
        return [option, Object.fromEntries(byDay) as object]
      })
      return [[`${animals} ${packing}`, Object.fromEntries(byOption) as object] as const]
    }),
  )
  const lines = (entries: readonly (readonly [name: string, value: object])[]) =>
    entries.map(([name, value]) => `    ${JSON.stringify(name)}: ${JSON.stringify(value)},`).join('\n')
  return `// Written by \`npm run season:build\` with the trip engine, from assets/data/climate-grid.csv (NOAA NCEI normals) and the
// classes of season-classes.facts.ts; do not edit. Figures are letters of season-code.ts, levels those of season-scale.ts.
import type { SeasonTable } from '@/shared/domain/season/season-table'

/** Climate bands of cells of ${CELL_DEG} degrees: row and column of the first cell, then a letter a cell eastwards. */
// prettier-ignore
export const bandRows: readonly (readonly [row: number, column: number, bands: string])[] = [
${inTens(rowsOf(cells, bands))}
]

// prettier-ignore
export const seasonTable: SeasonTable = {
  bands: ${BANDS},
  weeks: {
${lines(weekDays.map((day) => [day, { 1: weeks(day, 1), 2: weeks(day, 2) }]))}
  },
  limits: {
${lines(limits)}
  },
}
`
}

function inTens(rows: readonly Row[]): string {
  const tens = Array.from({ length: Math.ceil(rows.length / 10) }, (_, at) =>
    rows.slice(at * 10, at * 10 + 10),
  )
  return tens.map((ten) => `  ${ten.map((row) => JSON.stringify(row)).join(', ')},`).join('\n')
}
