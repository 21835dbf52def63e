import { Problem } from '@/shared/api/problem'
import { readCursor, writeCursor } from '@/shared/api/cursor'
import type { CellPoint } from '@/shared/domain/geo/location-cell'
import type { SearchKey, SearchQuery } from '@/server/search/search-query'

export interface SearchCursor {
  /** The last listing shown; cursors never carry inner numbers. */
  publicId: string
  key: Omit<SearchKey, 'listingId'>
}

const stale = () =>
  new Problem('cursor-unreadable', 'The place or the order of the list has changed. Start the search again.')

const placeText = ({ lat, lng }: CellPoint) => `${Math.round(lat * 1e6)},${Math.round(lng * 1e6)}`

/** Holds the origin and the sort, so that a link cannot go on in another list. */
export function writeSearchCursor(query: SearchQuery, key: SearchKey, publicId: string): string {
  const { by, dm2, seen } = key
  return writeCursor({ sort: query.sort, from: placeText(query.origin), by, dm2, seen, id: publicId })
}

/** Throws `cursor-unreadable` when the text is not ours or belongs to another place or sort. */
export function readSearchCursor(text: string, query: Pick<SearchQuery, 'origin' | 'sort'>): SearchCursor {
  const { sort, from, by, dm2, seen, id } = readCursor(text)
  if (sort !== query.sort || from !== placeText(query.origin)) throw stale()
  const numbers = [by, dm2, seen].map((value) => (typeof value === 'number' ? value : NaN))
  if (typeof id !== 'string' || !numbers.every((value) => Number.isSafeInteger(value) && value >= 0))
    throw stale()
  const [keyBy = 0, keyDm2 = 0, keySeen = 0] = numbers
  return { publicId: id, key: { by: keyBy, dm2: keyDm2, seen: keySeen } }
}
