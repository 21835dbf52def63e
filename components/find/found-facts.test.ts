import { describe, expect, it, vi } from 'vitest'

import { foundFacts } from './found-facts'

import type { FoundListing } from '@/shared/contracts/search'

vi.mock('@/hooks/api', () => ({ photoUrl: (id: string, width: number) => `/photos/${id}-${width}.webp` }))

const found: FoundListing = {
  listingId: 'abcdefghijklmnopqrstuv',
  category: 'fish',
  title: 'Nile tilapia',
  stage: 'fingerling',
  sizeLoMm: 50.8,
  sizeHiMm: 76.2,
  free: 1240,
  minOrder: 25,
  unitCents: 89,
  totalCents: 1902,
  waterC: 26,
  farmName: 'Creek Bend Hatchery',
  placeText: 'Batavia, OH',
  state: 'OH',
  lat: 39.075,
  lng: -84.175,
  distanceKm: 29,
  bearing: 'east',
  nextPickup: { startsAt: '2027-01-16T14:00:00Z', zone: 'America/New_York' },
  rating: { mean: 4.8, count: 12 },
  legal: { status: 'allowed', buy: 'yes' },
}

describe('a found listing on its tag', () => {
  it('prices the count that was asked', () => {
    const facts = foundFacts(found, { units: 'us', count: 20, state: 'OH', near: undefined })
    expect(facts).toMatchObject({ priceText: '$19.02', priceUnitText: 'for 20', sizeText: '2–3 in' })
    expect(facts.distanceText).toBe('about 18 mi east')
    expect(facts.badges.map(({ word }) => word)).toEqual(['Allowed in OH', '4.8 of 5 (12)'])
  })

  it('prices one, and names the smallest order, when no count was asked', () => {
    const facts = foundFacts(found, { units: 'metric', count: undefined, state: 'OH', near: undefined })
    expect(facts).toMatchObject({ priceText: '$0.89', priceUnitText: 'a fish', sizeText: '5–7.5 cm' })
    expect(facts.badges.map(({ word }) => word)).toContain('From 25 up')
  })

  it('shows the water in both scales, whatever the units', () => {
    expect(foundFacts(found, { units: 'us', count: 20, state: 'OH', near: undefined }).waterText).toBe(
      '79 °F (26 °C)',
    )
  })

  it('says neither distance nor law before a place is known', () => {
    const facts = foundFacts(found, { units: 'us', count: 20, state: undefined, near: undefined })
    expect(facts.distanceText).toBeUndefined()
    expect(facts.badges.map(({ word }) => word)).toEqual(['4.8 of 5 (12)'])
  })

  it('carries the place in the link only when it is another than the one in use', () => {
    const plain = foundFacts(found, { units: 'us', count: undefined, state: 'OH', near: undefined }).href
    expect(plain).toEqual({ pathname: '/listings/[listingId]', params: { listingId: found.listingId } })
    const elsewhere = foundFacts(found, { units: 'us', count: 20, state: 'IN', near: '47374' }).href
    expect(elsewhere).toMatchObject({ params: { near: '47374', count: '20' } })
  })
})
