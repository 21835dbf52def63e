import mysql from 'mysql2/promise'

import type { ListingSearch } from '@/server/search/listing-search'

const LANES_A_BAND = 128

/**
 * The negative control: makes every 40th listing dearer by a cent, and lets every 7th that is shipped come from another
 * band, behind the back of brute force. A run that does not report it checks nothing.
 */
export async function plantFault(ownerUrl: string): Promise<void> {
  const owner = await mysql.createConnection({ uri: ownerUrl })
  await owner.query('UPDATE listing_search SET price1 = price1 + 1 WHERE listing_id % 40 = 0')
  await plantLanes(owner)
  await owner.end()
}

/** The lane alone: only questions with a season filter can notice. */
export async function plantLanes(owner: mysql.Connection): Promise<void> {
  await owner.query(
    `UPDATE listing_search SET lane = IF(lane > ${LANES_A_BAND}, lane - ${LANES_A_BAND}, 0) WHERE lane > 0 AND listing_id % 7 = 1`,
  )
}

/** The other control: right answers that take longer, with the season filter only. */
export function plantSlowness({ search }: Pick<ListingSearch, 'search'>): Pick<ListingSearch, 'search'> {
  return {
    search: async (query) => {
      for (let more = 0; query.shipped && more < 2; more++) await search(query)
      return search(query)
    },
  }
}
