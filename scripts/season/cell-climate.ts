import { readFileSync } from 'node:fs'
import path from 'node:path'

import { designWeather, type AirDay } from '@/shared/domain/climate/design-weather'
import { normalYear, type NormalDay } from '@/shared/domain/climate/normal-day'
import { readClimateCsv } from '@/shared/domain/climate/read-climate-csv'
import { SEASON_CONFIDENCE } from '@/shared/domain/season/season-classes.facts'
import { CELL_DEG } from '@/shared/domain/season/cell-size'

/** The days that any point of a cell can have in a week: its cold and hot design days, each at both of its ends. */
export interface WeekAir {
  /** The coldest cold day. */
  cold: AirDay
  /** The hottest hot day. */
  hot: AirDay
  /** The warmest cold day. */
  mildCold: AirDay
  /** The coolest hot day. */
  mildHot: AirDay
}

export interface CellClimate {
  /** South-west corner, in half degrees. */
  row: number
  column: number
  /** Postal codes in it, plus one: where people live counts more. */
  weight: number
  /** By nights on the way (1, 2), then by week 0-51. */
  weeks: readonly (readonly WeekAir[])[]
}

/** A node's spread counts as 1 °C at least; the smallest in the table is 0.7 °C, and nights count 1.6 of it at most. */
const SPREAD_SLACK_C = 0.5
const YEAR = 365
export const WEEKS = 52

/** Days of the year, any of which may lie in this ISO week (1-52; the last holds week 53 too). */
export function daysOfWeek(week: number): number[] {
  const last = week === WEEKS ? 7 * WEEKS + 9 : 7 * (week - 1) + 9
  const first = 7 * (week - 1) - 4
  return Array.from({ length: last - first + 1 }, (_, at) => (((first + at) % YEAR) + YEAR) % YEAR)
}

/** Raw design days: before minimum and maximum are kept in order, so that a mean of nodes is never harsher. */
function designDay(day: NormalDay, nights: number): WeekAir {
  const steep = { ...day, minC: -1000, maxC: 1000 }
  const apart = designWeather(steep, nights, SEASON_CONFIDENCE)
  if (!apart) throw new Error('The season has no confidence.')
  const [below, above] = [apart.cold.minC + 1000, apart.hot.maxC - 1000]
  const cold = { minC: day.minC + below, maxC: day.maxC - above }
  const hot = { minC: day.minC - below, maxC: day.maxC + above }
  // In its mildest form minimum and maximum count in order; between nodes the spread may be as small as nature has it.
  const mildCold = { minC: cold.minC + SPREAD_SLACK_C, maxC: Math.max(cold.minC, cold.maxC) + SPREAD_SLACK_C }
  const mildHot = { minC: Math.min(hot.minC, hot.maxC) - SPREAD_SLACK_C, maxC: hot.maxC - SPREAD_SLACK_C }
  return { cold, hot, mildCold, mildHot }
}

const least = (a: AirDay, b: AirDay) => ({ minC: Math.min(a.minC, b.minC), maxC: Math.min(a.maxC, b.maxC) })
const most = (a: AirDay, b: AirDay) => ({ minC: Math.max(a.minC, b.minC), maxC: Math.max(a.maxC, b.maxC) })

/** Both ends of all of them. */
export const widest = (all: readonly WeekAir[]): WeekAir =>
  all.reduce((a, b) => ({
    cold: least(a.cold, b.cold),
    hot: most(a.hot, b.hot),
    mildCold: most(a.mildCold, b.mildCold),
    mildHot: least(a.mildHot, b.mildHot),
  }))

/** Every half-degree cell with at least one node of the climate table at its corners. */
export function cellClimates(): CellClimate[] {
  const nodes = new Map<string, WeekAir[][]>()
  const nodeRows = readClimateCsv(readFileSync(path.resolve('assets/data/climate-grid.csv'), 'utf8'))
  for (const { lat, lng, normals } of nodeRows) {
    const year = normalYear(normals)
    const weeks = [1, 2].map((nights) => {
      const days = year.map((day) => designDay(day, nights))
      return Array.from({ length: WEEKS }, (_, week) =>
        widest(daysOfWeek(week + 1).flatMap((day) => days[day] ?? [])),
      )
    })
    nodes.set(`${Math.round(lat / CELL_DEG)} ${Math.round(lng / CELL_DEG)}`, weeks)
  }
  const weights = postalCodes()
  const places = new Set([...nodes.keys()].flatMap(cellsAround))
  return [...places].sort().map((key) => {
    const [row = 0, column = 0] = key.split(' ').map(Number)
    const found = cornersOf(nodes, row, column)
    const weeks = [0, 1].map((nights) =>
      Array.from({ length: WEEKS }, (_, week) => widest(found.flatMap((node) => node[nights]?.[week] ?? []))),
    )
    return { row, column, weight: 1 + (weights.get(key) ?? 0), weeks }
  })
}

function cornersOf(nodes: ReadonlyMap<string, WeekAir[][]>, row: number, column: number): WeekAir[][][] {
  return [0, 1].flatMap((up) =>
    [0, 1].flatMap((right) => {
      const node = nodes.get(`${row + up} ${column + right}`)
      return node ? [node] : []
    }),
  )
}

function cellsAround(key: string): string[] {
  const [row = 0, column = 0] = key.split(' ').map(Number)
  return [`${row} ${column}`, `${row - 1} ${column}`, `${row} ${column - 1}`, `${row - 1} ${column - 1}`]
}

function postalCodes(): Map<string, number> {
  const counts = new Map<string, number>()
  const lines = readFileSync(path.resolve('assets/data/zips.csv'), 'utf8').split('\n')
  const heading = lines.find((line) => line.startsWith('zip'))?.split(',') ?? []
  const [latAt, lngAt] = [heading.indexOf('lat'), heading.indexOf('lng')]
  for (const line of lines) {
    const parts = line.split(',')
    const [lat, lng] = [Number(parts[latAt]), Number(parts[lngAt])]
    if (!Number.isFinite(lat) || !Number.isFinite(lng) || lat === 0) continue
    const key = `${Math.floor(lat / CELL_DEG)} ${Math.floor(lng / CELL_DEG)}`
    counts.set(key, (counts.get(key) ?? 0) + 1)
  }
  return counts
}
