import { and, asc, between, desc, eq, like, or, sql, type SQL } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { cellPopulation, cityPlace, zipPlace } from '@/db/schema/places'
import type { CellPoint, LocationCell } from '@/shared/domain/geo/location-cell'

export interface NamedPoint extends CellPoint {
  name: string
  state: string
  zip?: string
}

const zipColumns = {
  name: zipPlace.city,
  state: zipPlace.state,
  zip: zipPlace.zip,
  lat: zipPlace.lat,
  lng: zipPlace.lng,
}
const cityColumns = {
  name: cityPlace.name,
  state: cityPlace.state,
  lat: cityPlace.lat,
  lng: cityPlace.lng,
}

const startsWith = (text: string) => `${text.replace(/[\\%_]/g, '\\$&')}%`

export async function findZip(zip: string, tx: Tx = db()): Promise<NamedPoint | null> {
  const [found] = await tx.select(zipColumns).from(zipPlace).where(eq(zipPlace.zip, zip))
  return found ?? null
}

export async function findZips(prefix: string, most: number): Promise<NamedPoint[]> {
  return db()
    .select(zipColumns)
    .from(zipPlace)
    .where(like(zipPlace.zip, startsWith(prefix)))
    .orderBy(asc(zipPlace.zip))
    .limit(most)
}

/** Towns whose name begins so, the largest first; with `state`, only there. */
export async function findCities(
  wanted: { name: string; state?: string },
  most: number,
): Promise<NamedPoint[]> {
  const named: SQL = like(cityPlace.name, startsWith(wanted.name))
  return db()
    .select(cityColumns)
    .from(cityPlace)
    .where(wanted.state ? and(named, eq(cityPlace.state, wanted.state)) : named)
    .orderBy(desc(cityPlace.population), asc(cityPlace.name), asc(cityPlace.state))
    .limit(most)
}

// 5, 28, 110 and 330 km: most places have a ZIP in the first box; what has none in the last is no US place.
const REACH_DEGREES = [0.05, 0.25, 1, 3]

/** The ZIP whose point lies nearest, up to about 300 km away; null beyond. */
export async function nearestZip({ lat, lng }: CellPoint): Promise<NamedPoint | null> {
  const narrow = Math.cos((lat * Math.PI) / 180)
  const apart = sql`pow(${zipPlace.lat} - ${lat}, 2) + pow((${zipPlace.lng} - ${lng}) * ${narrow}, 2)`
  for (const reach of REACH_DEGREES) {
    const [found] = await db()
      .select({ ...zipColumns, apart: sql<number>`${apart}` })
      .from(zipPlace)
      .where(
        and(
          between(zipPlace.lat, lat - reach, lat + reach),
          between(zipPlace.lng, lng - reach / narrow, lng + reach / narrow),
          sql`${apart} <= ${reach * reach}`,
        ),
      )
      .orderBy(apart, asc(zipPlace.zip))
      .limit(1)
    if (found) return { name: found.name, state: found.state, zip: found.zip, lat: found.lat, lng: found.lng }
  }
  return null
}

/** People living in places inside each of these cells; a cell without a row has none. */
export async function populationsOf(cells: LocationCell[], tx: Tx = db()): Promise<number[]> {
  const isCell = (cell: LocationCell) =>
    and(
      eq(cellPopulation.sizeThousandths, cell.sizeThousandths),
      eq(cellPopulation.iy, cell.iy),
      eq(cellPopulation.ix, cell.ix),
    )
  const rows = await tx
    .select()
    .from(cellPopulation)
    .where(or(...cells.map(isCell)))
  return cells.map(
    (cell) =>
      rows.find(
        (row) => row.sizeThousandths === cell.sizeThousandths && row.iy === cell.iy && row.ix === cell.ix,
      )?.population ?? 0,
  )
}
