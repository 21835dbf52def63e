import { describe, expect, it } from 'vitest'

import { pinOf, toPins } from './pins'

import type { FoundListing } from '@/shared/contracts/search'

const at = (listingId: string, lat: number, title: string) =>
  ({ listingId, lat, lng: -84.175, title, placeText: 'Batavia, OH' }) as FoundListing

describe('pins for the listings found', () => {
  it('hangs all listings of one cell on one pin', () => {
    const found = [at('a', 39.075, 'Bluegill'), at('b', 39.075, 'Koi'), at('c', 39.125, 'Nile tilapia')]
    expect(toPins(found)).toEqual([
      { id: '39.075,-84.175', lat: 39.075, lng: -84.175, count: 2, label: '2 listings, Batavia, OH' },
      { id: '39.125,-84.175', lat: 39.125, lng: -84.175, count: 1, label: 'Nile tilapia, Batavia, OH' },
    ])
  })

  it('leads from a listing to its pin', () => {
    const found = [at('a', 39.075, 'Bluegill')]
    expect(toPins(found)[0]?.id).toBe(pinOf(at('a', 39.075, 'Bluegill')))
  })
})
