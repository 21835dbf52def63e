import { describe, expect, it } from 'vitest'

import { checkDates } from '@/server/listings/check-dates'
import type { ListingBody } from '@/shared/contracts/listings'

const today = '2027-01-15'
const asked = {
  category: 'fish',
  hatchedOn: '2026-11-01',
  water: { measuredOn: '2027-01-10' },
  photos: [{ takenOn: '2027-01-10' }],
  windows: [{ day: '2027-01-23' }],
}
const faults = (change: object, onSale: object | null = null) =>
  checkDates({ ...asked, ...change } as unknown as ListingBody, today, onSale as ListingBody | null).map(
    (fault) => fault.pointer,
  )

describe('dates of a batch', () => {
  it('has nothing against fresh readings and photos', () => expect(faults({})).toEqual([]))

  it('asks for new readings after fourteen days, and believes no future ones', () => {
    expect(faults({ water: { measuredOn: '2027-01-01' } })).toEqual([])
    expect(faults({ water: { measuredOn: '2026-12-31' } })).toEqual(['#/draft/water/measuredOn'])
    expect(faults({ water: { measuredOn: '2027-01-16' } })).toEqual(['#/draft/water/measuredOn'])
  })

  it('does not ask again what buyers see already', () => {
    const old = { ...asked, water: { measuredOn: '2026-12-01' }, photos: [{ takenOn: '2026-10-01' }] }
    expect(faults(old, old)).toEqual([])
    expect(faults(old)).toEqual(['#/draft/water/measuredOn', '#/draft/photos/0/takenOn'])
  })

  it('sells a batch that is not hatched yet only with a ready date, and collects it from then on', () => {
    expect(faults({ hatchedOn: '2027-02-01', windows: [{ day: '2027-03-01' }] })).toEqual(['#/draft/readyOn'])
    expect(faults({ hatchedOn: '2027-02-01', readyOn: '2027-01-20' })).toEqual(['#/draft/readyOn'])
    expect(faults({ hatchedOn: '2027-02-01', readyOn: '2027-03-01' })).toEqual(['#/draft/windows/0/day'])
    const ready = { hatchedOn: '2027-02-01', readyOn: '2027-03-01', windows: [{ day: '2027-03-01' }] }
    expect(faults(ready)).toEqual([])
  })
})
