import type { ListingSearch } from '@/server/search/listing-search'
import type { SearchHit } from '@/server/search/search-query'
import { bruteForce } from '@/tests/bench/brute-force'
import { chances } from '@/tests/bench/chances'
import { pageFault } from '@/tests/bench/compare-page'
import { anyQuery } from '@/tests/bench/make-query'
import type { MadeListings } from '@/tests/bench/made-listings'

const PAGES = 5

/** Pages put together must equal one long list, ties included. Returns what did not. */
export async function pagingFaults(
  made: MadeListings,
  search: ListingSearch,
  walks: number,
): Promise<string[]> {
  const ask = anyQuery(made, chances(99))
  const faults: string[] = []
  for (let walk = 0; walk < walks; walk++) {
    const query = ask()
    const expected = bruteForce(made, query).slice(0, PAGES * query.limit)
    const hits: SearchHit[] = []
    let page = await search.search(query)
    hits.push(...page.hits)
    for (let pages = 1; page.next && pages < PAGES; pages++) {
      page = await search.search({ ...query, after: page.next })
      hits.push(...page.hits)
    }
    const fault = pageFault(hits, expected)
    if (fault) faults.push(`paging: ${fault} for ${JSON.stringify(query)}`)
  }
  return faults
}
