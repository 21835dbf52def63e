import { now } from '@/server/clock'
import { findListing } from '@/server/listings/listing-store'
import { presentFound } from '@/server/search/present-found'
import { readFound } from '@/server/search/found-store'
import { readPlaces } from '@/server/search/read-places'
import { readWishes } from '@/server/search/read-wishes'
import { readSearchCursor, writeSearchCursor } from '@/server/search/search-cursor'
import type { SearchKey, SearchQuery } from '@/server/search/search-query'
import { theSearch } from '@/server/search/the-search'
import { Problem } from '@/shared/api/problem'
import type { ParsedQuery, ReplyOf } from '@/shared/api/endpoint'
import type { searchListings } from '@/shared/contracts/search'

type Asked = ParsedQuery<typeof searchListings>

async function keyAfter(cursor: string, query: SearchQuery): Promise<SearchKey> {
  const { publicId, key } = readSearchCursor(cursor, query)
  const last = await findListing(publicId)
  if (!last) throw new Problem('cursor-unreadable', 'That listing is gone. Start the search again.')
  return { ...key, listingId: last.id }
}

async function cursorAfter(query: SearchQuery, next: SearchKey): Promise<string | undefined> {
  const last = (await readFound([next.listingId])).get(next.listingId)
  return last && writeSearchCursor(query, next, last.publicId)
}

/** One page of what can be bought near a place. */
export async function searchPage(asked: Asked): Promise<ReplyOf<typeof searchListings>> {
  const at = now()
  const { place, destination, when, shipTo } = await readPlaces(asked, at)
  const wishes = readWishes(asked, { place, shipTo, today: at.toISOString().slice(0, 10) })
  const query: SearchQuery = { ...wishes, sort: asked.sort, limit: asked.limit }
  const after = asked.cursor ? await keyAfter(asked.cursor, query) : undefined
  const page = await theSearch().search(after ? { ...query, after } : query)
  const nextCursor = page.next ? await cursorAfter(query, page.next) : undefined
  return {
    items: await presentFound(page.hits, { place, destination, when, at, count: asked.count }),
    ...(nextCursor ? { nextCursor } : {}),
    thisMonday: when.thisMonday,
    place: { label: place.label, state: place.state, lat: place.centre.lat, lng: place.centre.lng },
  }
}
