// `npm run check:season`: the season table may be stricter than the trip engine, never milder. `--slice`: a part of it.
// `--plant-fault`: one figure of the table is made milder by one degree, and another table has all its cold days milder by
// eight; both must be found (exit code 1).
import { shippedClimate } from '@/scripts/calc/climate-commands'
import { mildLimits } from '@/scripts/season/audit-table'
import { compareSeason } from '@/scripts/season/compare-season'
import { randomJourneys } from '@/scripts/season/random-journeys'
import { encodeFigures, valueOf } from '@/shared/domain/season/season-code'
import { LEVELS } from '@/shared/domain/season/season-scale'
import type { SeasonTable } from '@/shared/domain/season/season-table'
import { seasonTable } from '@/shared/domain/season/season-table.gen'
import { writeReport } from '@/scripts/write-report.mjs'

const SEED = 20261201
const SAFE_SHARE_LEAST = 0.02
const isSlice = process.argv.includes('--slice')
const isFault = process.argv.includes('--plant-fault')

/** Tilapia in thick foam from the mildest origin: the destination may be one degree colder than the engine bears. */
function spoilt(): SeasonTable {
  const spoilt = structuredClone(seasonTable) as {
    limits: Record<string, Record<'none-middle', Record<'cold', string>>>
  }
  const row = spoilt.limits['tilapia foam-38-overnight']?.['none-middle']
  const last = row && valueOf(row.cold, LEVELS - 1)
  if (!row || !last) throw new Error('The table holds no tilapia in thick foam.')
  row.cold = row.cold.slice(0, LEVELS - 1) + encodeFigures([last - 1])
  return spoilt as unknown as SeasonTable
}

/** All cold days of all bands eight degrees milder than they are. */
function warmed(): SeasonTable {
  const milder = (text: string) =>
    encodeFigures(
      Array.from(text, (_, at) => {
        const level = valueOf(text, at)
        return level === null ? null : Math.min(LEVELS - 1, level + 8)
      }),
    )
  const { cold } = seasonTable.weeks
  return {
    ...seasonTable,
    weeks: { ...seasonTable.weeks, cold: { 1: cold[1].map(milder), 2: cold[2].map(milder) } },
  }
}

function plantFaults() {
  const { mild } = mildLimits(spoilt(), 1)
  const { milder } = compareSeason(shippedClimate(), warmed(), randomJourneys(4000, SEED))
  console.log(`Found ${mild.length} limit too mild and ${milder.length} journeys judged too mildly.`)
  if (mild.length === 1 && milder.length > 0) process.exitCode = 1
}

async function check() {
  const table = seasonTable
  const audit = mildLimits(table, isSlice ? 7 : 1)
  await report('SEASON-limits-too-mild', audit.mild.length, `0 of ${audit.looked}`)
  for (const one of audit.mild.slice(0, 5)) console.log(`  too mild: ${one}`)
  const journeys = randomJourneys(isSlice ? 2000 : 10_000, SEED)
  const { milder, ...counts } = compareSeason(shippedClimate(), table, journeys)
  await report('SEASON-milder-than-engine', milder.length, `0 of ${journeys.length}`)
  for (const one of milder.slice(0, 5)) console.log(`  milder: ${JSON.stringify(one)}`)
  console.log(`  ${JSON.stringify(counts)}`)
  // A table that never says safe would pass the bar above. Cartons, far climates and animals without a model are drawn too.
  const bar = journeys.length * SAFE_SHARE_LEAST
  await writeReport({
    id: 'SEASON-says-safe',
    figure: counts.tableSafe,
    bar: `at least ${bar}`,
    pass: counts.tableSafe >= bar,
    seed: SEED,
  })
  if (counts.tableSafe < bar) process.exitCode = 1
}

async function report(id: string, figure: number, bar: string) {
  const pass = figure === 0
  await writeReport({ id, figure, bar, pass, seed: SEED })
  if (!pass) process.exitCode = 1
}

Promise.resolve(isFault ? plantFaults() : check()).catch((error: unknown) => {
  console.error(error)
  process.exitCode = 2
})
