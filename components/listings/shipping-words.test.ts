import { describe, expect, it } from 'vitest'

import { shippingBadge } from './shipping-words'

import type { ShippedTo } from '@/shared/contracts/shipping'

const way: ShippedTo = { isServed: true, verdict: 'safe', monday: '2027-04-05', isThisWeek: true }
const word = (change: Partial<ShippedTo>) => shippingBadge({ ...way, ...change }, 'OH').word

describe('whether a batch ships to you', () => {
  it('says so for this week and for another', () => {
    expect(word({})).toBe('Ships to you this week')
    expect(word({ verdict: 'safe-with-packs' })).toBe('Ships to you this week, with packs')
    expect(word({ isThisWeek: false })).toBe('Ships to you in the week of Apr 5')
  })

  it('says what is wrong and when it will be right', () => {
    expect(word({ verdict: 'too-cold', nextMonday: '2027-04-12' })).toBe(
      'Too cold to ship this week; next safe week: Apr 12',
    )
    expect(word({ verdict: 'too-hot' })).toBe('Too hot to ship this week; no week of the year is safe')
    expect(word({ verdict: 'unknown' })).toBe('Shipping weather not known here')
  })

  it('never promises what the seller does not offer', () => {
    expect(word({ isServed: false })).toBe('Not shipped to OH')
  })
})
