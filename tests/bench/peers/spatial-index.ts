import mysql from 'mysql2/promise'

import { EARTH_RADIUS_M } from '@/shared/domain/geo/earth-point'
import type { SearchQuery } from '@/server/search/search-query'
import { priceSql, wishSql } from '@/server/search/search-sql'
import type { OpenPeer } from '@/tests/bench/peers/peer'

const KM_PER_DEGREE = 111.195

/** Rectangle around the circle; the questions stay clear of the date line and the poles. */
function boxText({ origin, radiusKm }: SearchQuery): string {
  const high = (radiusKm / KM_PER_DEGREE) * 1.001
  const poleward = Math.min(89, Math.abs(origin.lat) + high)
  const wide = high / Math.cos((poleward * Math.PI) / 180)
  const [west, east] = [origin.lng - wide, origin.lng + wide]
  const [south, north] = [origin.lat - high, origin.lat + high]
  return `POLYGON((${west} ${south},${east} ${south},${east} ${north},${west} ${north},${west} ${south}))`
}

function pageSql(query: SearchQuery): string {
  const { origin, categoryCode, speciesCode, radiusKm } = query
  const metres = `ST_Distance_Sphere(pt, POINT(${origin.lng}, ${origin.lat}), ${EARTH_RADIUS_M})`
  const tests = [
    `MBRContains(ST_GeomFromText('${boxText(query)}'), pt)`,
    ...(categoryCode === undefined ? [] : [`category=${categoryCode}`]),
    ...(speciesCode === undefined ? [] : [`species=${speciesCode}`]),
    ...wishSql(query),
    `${metres}<=${radiusKm * 1000}`,
  ]
  const order = query.sort === 'cheapest' ? `${priceSql(query)},listing_id` : 'metres,listing_id'
  return `SELECT ${metres} AS metres,${priceSql(query)} FROM listing_spatial WHERE ${tests.join(' AND ')} ORDER BY ${order} LIMIT ${query.limit}`
}

/** The textbook way in this database: a POINT, a SPATIAL INDEX and ST_Distance_Sphere, with its best other keys. */
export const openSpatialIndex: OpenPeer = async ({ ownerUrl, seldom }) => {
  const owner = await mysql.createConnection({ uri: ownerUrl })
  await owner.query(
    'CREATE TABLE listing_spatial AS SELECT *, POINT(lng_e_6 / 1e6, lat_e_6 / 1e6) AS pt FROM listing_search',
  )
  await owner.query(
    'ALTER TABLE listing_spatial MODIFY pt POINT NOT NULL, ADD PRIMARY KEY (listing_id), ADD SPATIAL INDEX (pt), ADD INDEX (category, species)',
  )
  await owner.query('ANALYZE TABLE listing_spatial')
  // With the filter on, 10.11 takes the spatial index as a filter for the other key and fails with error 1207.
  await owner.query("SET SESSION optimizer_switch = 'rowid_filter=off'")
  return {
    name: 'SPATIAL INDEX',
    shapes: ['A', 'B', 'C', 'D', 'E'],
    every: seldom,
    find: async (query) => {
      const [rows] = await owner.query<mysql.RowDataPacket[][]>({ sql: pageSql(query), rowsAsArray: true })
      return rows.map(([metres, unitCents]) => ({
        distanceKm: Number(metres) / 1000,
        unitCents: Number(unitCents),
      }))
    },
    close: () => owner.end(),
  }
}
