import { HILBERT_BITS } from '@/shared/domain/geo/hilbert'
import { FINEST_LEVEL, type DensityCell } from '@/server/search/density-histogram'
import { readSearchRows } from '@/server/search/read-search-store'

const COUNTING_PATIENCE_MS = 15_000

/** One pass over the narrowest index with a place in it. */
export async function countDensity(): Promise<DensityCell[]> {
  const shift = 2 * (HILBERT_BITS - FINEST_LEVEL)
  const rows = await readSearchRows(
    `SELECT category, species, hil >> ${shift} AS cell, COUNT(*) FROM listing_search GROUP BY category, species, cell`,
    COUNTING_PATIENCE_MS,
  )
  return rows.map(([categoryCode = 0, speciesCode = 0, cell = 0, count = 0]) => ({
    categoryCode,
    speciesCode,
    cell,
    count,
  }))
}
