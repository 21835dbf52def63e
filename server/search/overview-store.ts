import { HILBERT_BITS } from '@/shared/domain/geo/hilbert'
import { DensityHistogram, FINEST_LEVEL } from '@/server/search/density-histogram'
import { Ladder } from '@/server/search/ladder'
import { readSearchRows } from '@/server/search/read-search-store'

const COUNTING_PATIENCE_MS = 15_000

/** What a planner knows of all listings: where they stand, when they can be had, how they are rated. */
export interface Overview {
  density: DensityHistogram
  days: Ladder
  ranks: Ladder
}

async function countDensity(): Promise<DensityHistogram> {
  const shift = 2 * (HILBERT_BITS - FINEST_LEVEL)
  const rows = await readSearchRows(
    `SELECT category,species,hil>>${shift} AS cell,COUNT(*) FROM listing_search GROUP BY category,species,cell`,
    COUNTING_PATIENCE_MS,
  )
  return new DensityHistogram(
    rows.map(([categoryCode = 0, speciesCode = 0, cell = 0, count = 0]) => ({
      categoryCode,
      speciesCode,
      cell,
      count,
    })),
  )
}

async function countRungs(
  column: 'next_day' | 'rating_rank',
  index: 'k_soonest' | 'k_rated',
): Promise<Ladder> {
  const rows = await readSearchRows(
    `SELECT category,${column},COUNT(*) FROM listing_search FORCE INDEX (${index}) GROUP BY category,${column}`,
    COUNTING_PATIENCE_MS,
  )
  return new Ladder(rows.map(([categoryCode = 0, rung = 0, count = 0]) => ({ categoryCode, rung, count })))
}

/** Three passes over indexes, one after the other: nobody waits for them. */
export async function countOverview(): Promise<Overview> {
  const density = await countDensity()
  const days = await countRungs('next_day', 'k_soonest')
  return { density, days, ranks: await countRungs('rating_rank', 'k_rated') }
}
