import { execFileSync } from 'node:child_process'
import { mkdirSync, writeFileSync } from 'node:fs'
import { availableParallelism, loadavg } from 'node:os'
import path from 'node:path'

import type { PairTimes, SeasonResult } from '@/tests/bench/measure-season'
import type { BenchFlags } from '@/tests/bench/read-flags'
import type { ShapeResult } from '@/tests/bench/run-shape'
import type { Times } from '@/tests/bench/times'

const FOLDER = path.resolve('.data/reports')

export interface BenchReport {
  flags: BenchFlags
  madeAt: string
  node: string
  mariadb: string
  cores: number
  loadAverage: number
  commit: string
  results: ShapeResult[]
  /** The same questions with and without the season filter. */
  season: SeasonResult
  extras: Record<string, Times>
  skipped: string[]
  faults: string[]
}

function commit(): string {
  try {
    return execFileSync('git', ['rev-parse', '--short', 'HEAD'], { encoding: 'utf8' }).trim()
  } catch {
    return 'unknown'
  }
}

/** Everything needed to judge a figure later: ratios are only ever taken inside one such run. */
export function makeReport(
  run: Pick<BenchReport, 'flags' | 'mariadb' | 'results' | 'season' | 'extras' | 'skipped' | 'faults'>,
): BenchReport {
  return {
    ...run,
    madeAt: new Date().toISOString(),
    node: process.version,
    cores: availableParallelism(),
    loadAverage: loadavg()[0] ?? 0,
    commit: commit(),
  }
}

const ms = (value: number) => value.toFixed(2).padStart(9)

function printPairs(name: string, { plain, shipped, ratio, meanHits }: PairTimes): void {
  const hits = `hits ${meanHits.plain.toFixed(1)} / ${meanHits.shipped.toFixed(1)}`
  console.log(
    `  ${name.padEnd(10)}${ms(plain.p50Ms)} / ${ms(plain.p95Ms)} without ${ms(shipped.p50Ms)} / ${ms(shipped.p95Ms)} with  (${plain.samples})  ratio ${ratio.toFixed(3)}  ${hits}`,
  )
}

export function printReport({ results, season, extras, flags, loadAverage, cores }: BenchReport): void {
  console.log(
    `${flags.listings} listings, seed ${flags.seed}, ${cores} cores, load ${loadAverage.toFixed(1)}`,
  )
  console.log('times in ms; ratio = ours / theirs at the median; read ratios, not milliseconds')
  for (const { shape, ours, peers, meanTrips, meanRowsRead, meanHits } of results) {
    console.log(
      `\n${shape}  trips ${meanTrips.toFixed(2)}  rows read ${meanRowsRead.toFixed(0)}  hits ${meanHits.toFixed(1)}`,
    )
    console.log(`  ${'ours'.padEnd(16)}${ms(ours.p50Ms)} / ${ms(ours.p95Ms)}  (${ours.samples})`)
    for (const [name, times] of Object.entries(peers)) {
      const ratio = (ours.p50Ms / times.p50Ms).toFixed(3)
      console.log(
        `  ${name.padEnd(16)}${ms(times.p50Ms)} / ${ms(times.p95Ms)}  (${times.samples})  ratio ${ratio}`,
      )
    }
  }
  console.log('\nwith and without the season filter, in pairs')
  printPairs('all', season.all)
  for (const [kind, times] of Object.entries(season.kinds)) printPairs(kind, times)
  console.log('')
  for (const [name, times] of Object.entries(extras)) {
    console.log(`  ${name.padEnd(32)}${ms(times.p50Ms)} / ${ms(times.p95Ms)}  (${times.samples})`)
  }
}

export function saveReport(report: BenchReport): string {
  mkdirSync(FOLDER, { recursive: true })
  const file = path.join(FOLDER, `search-${report.flags.listings}.json`)
  writeFileSync(file, `${JSON.stringify(report, null, 2)}\n`)
  return file
}
