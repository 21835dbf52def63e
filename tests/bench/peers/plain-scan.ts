import type { OpenPeer } from '@/tests/bench/peers/peer'
import { readSearchRows } from '@/server/search/read-search-store'
import { kmOfSquaredChord } from '@/shared/domain/geo/earth-point'
import { classSql } from '@/server/search/find-in-circle'
import { orderSql, selectedSql } from '@/server/search/search-order'
import { insideSql, wishSql } from '@/server/search/search-sql'

const PATIENCE_MS = 60_000

/** Every row tested, no index, but our sort key without trigonometry: what the indexes are worth. */
export const openPlainScan: OpenPeer = async ({ seldom }) => ({
  name: 'plain scan',
  shapes: ['A', 'B', 'C', 'D', 'E', 'F', 'G'],
  every: seldom,
  find: async (query) => {
    const tests = [...classSql(query).where, insideSql(query, query.radiusKm), ...wishSql(query)]
    const rows = await readSearchRows(
      `SELECT ${selectedSql(query)} FROM listing_search USE INDEX () WHERE ${tests.join(' AND ')} ORDER BY ${orderSql(query)} LIMIT ${query.limit}`,
      PATIENCE_MS,
    )
    return rows.map(([, dm2 = 0, unitCents = 0]) => ({ distanceKm: kmOfSquaredChord(dm2), unitCents }))
  },
  close: async () => {},
})
