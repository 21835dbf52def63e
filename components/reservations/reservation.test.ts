import { describe, expect, it } from 'vitest'

import { isShippedHere, quoteReservation, reservationErrors, type ReservationDraft } from './reservation'
import { blankAddress } from './ship-address'

import type { ShownListing } from '@/shared/contracts/listings'

const shipping = {
  ...{ packing: 'foam-38-overnight', boxCents: 1200, freightCents: 3800, mostInBox: 30 },
  ...{ carrier: 'Overnight', carrierAccepts: true, holdsAtCounter: true, days: ['mon', 'tue'] },
}
const listing = {
  body: {
    category: 'fish',
    minOrder: 20,
    orderStep: 5,
    tiers: [{ fromCount: 20, unitCents: 95 }],
    depositPct: 25,
    statesServed: ['OH', 'KY'],
    shipping,
  },
  free: 200,
  windows: [{ windowId: 'w' }],
  gate: { buyerState: 'OH', ticks: [] },
  shipped: { isServed: true },
} as unknown as ShownListing

const address = {
  ...blankAddress('45402', 'OH'),
  ...{ name: 'June Park', street: '1 Mill Rd', city: 'Dayton', phone: '(937) 555-0100' },
}
const draft: ReservationDraft = {
  quantityText: '40',
  way: 'ship',
  windowId: '',
  shipDay: '2027-05-10',
  address,
  payMode: 'deposit',
  ticked: [],
  hasPlace: false,
  offered: [
    {
      shipDay: '2027-05-10',
      arriveDay: '2027-05-11',
      verdict: 'safe',
      basis: 'forecast',
      reasons: [],
    },
    {
      shipDay: '2027-05-11',
      arriveDay: '2027-05-12',
      verdict: 'unsafe',
      basis: 'forecast',
      reasons: [],
    },
  ],
}
const told = (change: Partial<ReservationDraft>, at: ShownListing = listing) =>
  reservationErrors(at, { ...draft, ...change }).map(({ fieldId }) => fieldId)

describe('a reservation', () => {
  it('costs animals alone at the gate, with boxes and freight at the door', () => {
    expect(quoteReservation(listing, '40', 'collect')).toMatchObject({ totalCents: 3800, landedCents: 95 })
    // 40 × $0.95, two boxes at $12 and $38.
    expect(quoteReservation(listing, '40', 'ship')).toMatchObject({
      boxes: 2,
      boxCents: 2400,
      freightCents: 7600,
      totalCents: 13_800,
      depositCents: 950,
      landedCents: 345,
    })
    expect(quoteReservation(listing, '19', 'ship')).toBeNull()
  })

  it('to be shipped asks for an address and a safe day, not for a window or a place', () => {
    expect(told({})).toEqual([])
    expect(told({ shipDay: '' })).toEqual(['ship-day'])
    expect(told({ shipDay: '2027-05-11' })).toEqual(['ship-day'])
    expect(told({ offered: null })).toEqual(['ship-day'])
    expect(told({ address: { ...address, zip: '454', phone: 'x' } })).toEqual(['ship-zip', 'ship-phone'])
    expect(told({ way: 'collect' })).toEqual(['place', 'window'])
  })

  it('is not shipped to a state the seller does not serve', () => {
    const elsewhere = { ...listing, shipped: { isServed: false } } as unknown as ShownListing
    expect(told({}, elsewhere)).toEqual(['ship-zip'])
    expect(isShippedHere(elsewhere)).toBe(false)
    expect(isShippedHere({ ...listing, shipped: undefined })).toBe(false)
  })
})
