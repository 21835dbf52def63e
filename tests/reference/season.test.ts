import { describe, expect, it } from 'vitest'

import { shippedClimate } from '@/scripts/calc/climate-commands'
import { mildLimits } from '@/scripts/season/audit-table'
import { cellClimates } from '@/scripts/season/cell-climate'
import { compareSeason } from '@/scripts/season/compare-season'
import { randomJourneys } from '@/scripts/season/random-journeys'
import { seasonBandAt } from '@/shared/domain/season/season-band'
import { CELL_DEG } from '@/shared/domain/season/cell-size'
import { valueOf } from '@/shared/domain/season/season-code'
import { dayOfLevel } from '@/shared/domain/season/season-scale'
import { seasonTable } from '@/shared/domain/season/season-table.gen'

describe('the season table against the trip engine', () => {
  // The whole of it, 10,000 journeys and every limit, is `npm run check:season`.
  it('is never milder on 1,500 random journeys', () => {
    const { milder, tableSafe } = compareSeason(shippedClimate(), seasonTable, randomJourneys(1500, 7))
    expect(milder).toEqual([])
    expect(tableSafe).toBeGreaterThan(30)
  })

  it('keeps limits that the engine bears out', () => {
    const { looked, mild } = mildLimits(seasonTable, 40)
    expect(looked).toBeGreaterThan(1000)
    expect(mild).toEqual([])
  })

  it('never takes a place for milder than its band', () => {
    let looked = 0
    for (const { row, column, weeks } of cellClimates()) {
      const band = seasonBandAt((row + 0.5) * CELL_DEG, (column + 0.5) * CELL_DEG)
      expect(band).not.toBeNull()
      for (const [at, week] of (weeks[1] ?? []).entries()) {
        const level = valueOf(seasonTable.weeks.cold[2][band ?? -1] ?? '', at)
        if (level === null) continue
        const { minC, maxC } = dayOfLevel('cold', level)
        looked++
        if (minC > week.cold.minC || maxC > week.cold.maxC)
          expect.fail(`cell ${row} ${column}, week ${at + 1}`)
      }
    }
    expect(looked).toBeGreaterThan(200_000)
  }, 60_000)
})
