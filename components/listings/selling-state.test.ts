import { describe, expect, it } from 'vitest'

import { whyNotHeld } from './selling-state'

import type { ShownListing } from '@/shared/contracts/listings'

const open = {
  state: 'live',
  free: 100,
  body: { minOrder: 25 },
  may: ['reserve'],
  gate: undefined,
} as unknown as ShownListing
const gate = (buy: string) => ({ ...open, gate: { buy, buyerState: 'IN' } }) as unknown as ShownListing

describe('whether something can be held from a listing', () => {
  it('lets a buyer hold from a live batch, allowed or to be ticked', () => {
    expect(whyNotHeld(open)).toBeNull()
    expect(whyNotHeld(gate('ticks'))).toBeNull()
    expect(whyNotHeld(gate('explicit-unknown'))).toBeNull()
  })

  it('shows no buy control where the species is prohibited or unknown across a line', () => {
    expect(whyNotHeld(gate('no'))?.title).toContain('Not for sale to a buyer in IN')
    expect(whyNotHeld(gate('ask-moderators'))?.title).toBe('Ask the moderators')
  })

  it('calls a batch sold out when less than the smallest order is left', () => {
    expect(whyNotHeld({ ...open, free: 24 })?.title).toBe('Sold out')
  })

  it('never offers a seller to buy from themselves', () => {
    expect(whyNotHeld({ ...open, may: ['edit'] })?.title).toBe('This is your own listing')
  })

  it('follows the server when it says no for a reason of its own', () => {
    expect(whyNotHeld({ ...open, may: [] })?.title).toBe('Not to be held now')
  })
})
