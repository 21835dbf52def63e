import type { MapView, Pin } from '@/server/search/map-pins'
import type { SearchFacets } from '@/server/search/search-facets'
import type { SearchPage, SearchQuery } from '@/server/search/search-query'

/** The only door to search, so that another way of finding can be put behind it. */
export interface ListingSearch {
  /** One page, and where the next one begins. Throws when the database does not answer in time. */
  search: (query: SearchQuery) => Promise<SearchPage>
  /** How many listings each category and species has inside the circle. Asked apart: it reads the whole circle. */
  facets: (query: SearchQuery) => Promise<SearchFacets>
  /** Marks for the map. */
  pins: (view: MapView) => Promise<Pin[]>
}
