import { describe, expect, it } from 'vitest'

import { reasonsAgainst, verdictLook, wayWords, worstWords } from './ship-day-words'

import type { ShipDayOffer } from '@/shared/contracts/shipments'

const offer: ShipDayOffer = {
  shipDay: '2027-05-10',
  arriveDay: '2027-05-11',
  verdict: 'safe',
  basis: 'forecast',
  reasons: [],
}
const cold = { side: 'cold', place: 'Dayton, OH', airC: -11 } as const

describe('a ship day in words', () => {
  it('says when the box leaves and arrives, in no zone but the calendar’s', () => {
    expect(wayWords(offer)).toBe('Leaves Mon, May 10, arrives Tue, May 11')
  })

  it('gives each verdict a word and a sign of its own', () => {
    const looks = [
      verdictLook(offer),
      verdictLook({ verdict: 'unknown', worst: undefined }),
      verdictLook({ verdict: 'unsafe', worst: cold }),
      verdictLook({ verdict: 'unsafe', worst: { ...cold, side: 'hot' } }),
      verdictLook({ verdict: 'unsafe', worst: undefined }),
    ]
    expect(looks.map(({ word }) => word)).toEqual([
      'Safe to ship',
      'We cannot say',
      'Too cold to ship',
      'Too hot to ship',
      'Not safe to ship',
    ])
    expect(new Set(looks.map(({ icon }) => icon)).size).toBe(5)
  })

  it('names the worst place in both scales, the reader’s first', () => {
    expect(worstWords({ worst: cold }, 'us')).toBe('Dayton, OH: down to 12 °F (-11 °C)')
    expect(worstWords({ worst: { ...cold, side: 'hot', airC: 38 } }, 'metric')).toBe(
      'Dayton, OH: up to 38 °C (100 °F)',
    )
  })

  it('never leaves a day that cannot be chosen without a reason', () => {
    const why = 'The water gets colder than this animal should travel in.'
    expect(reasonsAgainst({ ...offer, verdict: 'unsafe', worst: cold, reasons: [why] }, 'us')).toEqual([
      'Dayton, OH: down to 12 °F (-11 °C)',
      why,
    ])
    expect(reasonsAgainst({ ...offer, verdict: 'unsafe' }, 'us')).toHaveLength(1)
    expect(reasonsAgainst({ ...offer, verdict: 'unknown' }, 'us')).toHaveLength(1)
    expect(reasonsAgainst({ ...offer, reasons: ['a remark'] }, 'us')).toEqual([])
  })
})
