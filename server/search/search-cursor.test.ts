import { describe, expect, it } from 'vitest'

import { readSearchCursor, writeSearchCursor } from '@/server/search/search-cursor'
import type { SearchQuery } from '@/server/search/search-query'

const query: SearchQuery = {
  origin: { lat: 39.125, lng: -84.525 },
  radiusKm: 80,
  sort: 'cheapest',
  limit: 24,
}
const key = { by: 85, dm2: 123_456_789_012, listingId: 4711, seen: 48 }
const publicId = 'abcdefghijklmnopqrstuv'

describe('the cursor of a search', () => {
  const text = writeSearchCursor(query, key, publicId)

  it('brings back where the page ended', () => {
    expect(readSearchCursor(text, query)).toEqual({
      publicId,
      key: { by: 85, dm2: 123_456_789_012, seen: 48 },
    })
  })

  it('never carries the inner number of a listing', () => {
    expect(Buffer.from(text, 'base64url').toString()).not.toContain('4711')
  })

  it('is refused for another place or another order', () => {
    expect(() => readSearchCursor(text, { ...query, sort: 'nearest' })).toThrow(/changed/)
    expect(() => readSearchCursor(text, { ...query, origin: { lat: 39.175, lng: -84.525 } })).toThrow(
      /changed/,
    )
  })

  it.each([
    '',
    'x',
    'e30',
    Buffer.from('{"v":1,"sort":"cheapest","from":"39125000,-84525000"}').toString('base64url'),
  ])('is refused when it is not ours: %s', (forged) =>
    expect(() => readSearchCursor(forged, query)).toThrow(),
  )
})
