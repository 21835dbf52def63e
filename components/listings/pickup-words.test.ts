import { describe, expect, it } from 'vitest'

import { pickupDay, pickupHours, plainDay } from './pickup-words'

describe('when animals can be collected, in words', () => {
  const lateEvening = {
    startsAt: '2027-01-17T03:30:00Z',
    endsAt: '2027-01-17T04:30:00Z',
    zone: 'America/New_York',
  }

  it('names the day of the place, not of UTC', () => {
    expect(pickupDay(lateEvening)).toBe('Sat, Jan 16')
  })

  it('names the hours with the zone of the place', () => {
    expect(pickupHours(lateEvening).replace(/\s/gu, ' ')).toMatch(/^10:30 – 11:30 PM EST$/)
  })

  it('follows the clocks of a neighbouring zone', () => {
    const inBloomington = {
      startsAt: '2027-07-10T13:00:00Z',
      endsAt: '2027-07-10T14:00:00Z',
      zone: 'America/Chicago',
    }
    expect(pickupHours(inBloomington).replace(/\s/gu, ' ')).toMatch(/^8:00 – 9:00 AM CDT$/)
  })

  it('leaves a plain day where it is', () => {
    expect(plainDay('2026-12-31')).toBe('December 31, 2026')
  })
})
