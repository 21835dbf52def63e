import { openListingSearch } from '@/server/search/search-listings'

let opened: ReturnType<typeof openListingSearch> | undefined

/** The one search of this process: what it has counted and learnt serves every request. */
export function theSearch(): ReturnType<typeof openListingSearch> {
  opened ??= openListingSearch()
  return opened
}
