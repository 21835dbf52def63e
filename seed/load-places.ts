import { getTableName, sql } from 'drizzle-orm'
import { toSnakeCase } from 'drizzle-orm/casing'
import type { MySqlTable } from 'drizzle-orm/mysql-core'
import { escape } from 'mysql2'

import type { Database } from '@/db/client'
import { cellPopulation, cityPlace, zipPlace } from '@/db/schema/places'
import { readCsv } from '@/seed/read-csv'

const ROWS_A_STATEMENT = 2000

type Zip = typeof zipPlace.$inferInsert
type City = typeof cityPlace.$inferInsert
type Cell = typeof cellPopulation.$inferInsert

const zipsOf = (states: readonly string[] | undefined): Zip[] =>
  readCsv('zips.csv', ['zip', 'city', 'state', 'lat', 'lng'])
    .filter((row) => !states || states.includes(row.state))
    .map(({ zip, city, state, lat, lng }) => ({ zip, city, state, lat: Number(lat), lng: Number(lng) }))

/** Towns of the population table, and those known only as a post office: there with no people and the mean point. */
function citiesOf(zips: Zip[], states: readonly string[] | undefined): City[] {
  const towns: City[] = readCsv('cities.csv', ['name', 'state', 'lat', 'lng', 'population'])
    .filter((row) => !states || states.includes(row.state))
    .map(({ name, state, lat, lng, population }) => ({
      // Nobody types the mark that some Hawaiian names begin with.
      name: name.replace(/^[‘’'ʻ]/u, ''),
      state,
      lat: Number(lat),
      lng: Number(lng),
      population: Number(population),
    }))
  const key = (name: string, state: string) => `${name.toLowerCase()}|${state}`
  const known = new Set(towns.map((town) => key(town.name, town.state)))
  const offices = new Map<string, Zip[]>()
  for (const zip of zips) {
    const town = key(zip.city, zip.state)
    if (!known.has(town)) offices.set(town, [...(offices.get(town) ?? []), zip])
  }
  const mean = (values: number[]) => values.reduce((sum, value) => sum + value, 0) / values.length
  for (const group of offices.values()) {
    const [first] = group
    if (!first) continue
    const lat = mean(group.map((zip) => zip.lat))
    const lng = mean(group.map((zip) => zip.lng))
    towns.push({ name: first.city, state: first.state, lat, lng, population: 0 })
  }
  return towns
}

type Row = Record<string, string | number | undefined>

/** Written out, as the query builder takes five times as long over 100,000 rows. */
function insertText(table: MySqlTable, rows: readonly Row[]): string {
  const columns = Object.keys(rows[0] ?? {}).map(toSnakeCase)
  const values = rows.map((row) => `(${escape(Object.values(row))})`)
  return `insert into ${getTableName(table)} (${columns.join(',')}) values ${values.join(',')}`
}

async function fill(db: Database, table: MySqlTable, rows: readonly Row[]): Promise<void> {
  if ((await db.$count(table)) === rows.length) return
  await db.execute(sql`delete from ${table}`)
  for (let from = 0; from < rows.length; from += ROWS_A_STATEMENT) {
    await db.execute(sql.raw(insertText(table, rows.slice(from, from + ROWS_A_STATEMENT))))
  }
}

/** All cells, or those within the rectangle that a part of the ZIP codes spans. */
function cellsOf(zips: Zip[], isPart: boolean): Cell[] {
  const span = (values: number[]) => [Math.min(...values), Math.max(...values)] as const
  const [south, north] = span(zips.map((zip) => zip.lat + 90))
  const [west, east] = span(zips.map((zip) => zip.lng + 180))
  const isInside = ({ sizeThousandths: size, iy, ix }: Cell) =>
    (iy + 1) * size >= south * 1000 &&
    iy * size <= north * 1000 &&
    (ix + 1) * size >= west * 1000 &&
    ix * size <= east * 1000
  const cells = readCsv('cell-population.csv', ['sizeThousandths', 'iy', 'ix', 'population']).map((row) => ({
    sizeThousandths: Number(row.sizeThousandths),
    iy: Number(row.iy),
    ix: Number(row.ix),
    population: Number(row.population),
  }))
  return isPart ? cells.filter(isInside) : cells
}

/** ZIP codes, towns and people by cell, from assets/data. Full tables are left alone; `states` loads a part for tests. */
export async function loadPlaces(db: Database, part?: { states: readonly string[] }): Promise<void> {
  const zips = zipsOf(part?.states)
  await fill(db, zipPlace, zips)
  await fill(db, cityPlace, citiesOf(zips, part?.states))
  await fill(db, cellPopulation, cellsOf(zips, part !== undefined))
}
