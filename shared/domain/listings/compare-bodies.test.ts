import { describe, expect, it } from 'vitest'

import { compareBodies } from '@/shared/domain/listings/compare-bodies'
import { effectOfEdit } from '@/shared/domain/listings/material-edit'

const approved = {
  category: 'fish',
  taxonId: 'blue_tilapia',
  stage: 'fingerling',
  sizeLoMm: 50.8,
  hatchedOn: '2026-09-02',
  countOnHand: 2000,
  tiers: [
    { fromCount: 25, unitCents: 100 },
    { fromCount: 100, unitCents: 89 },
  ],
  water: { temperatureC: 22, pH: 7.4 },
  health: { treatments: 'None', lastLosses: 'None' },
  origin: 'hatched-here',
  statesServed: ['OH', 'KY'],
  windows: [{ day: '2027-01-23', from: '09:00', until: '10:00', capacity: 6 }],
  photos: [{ photoId: 'a'.repeat(32), takenOn: '2027-01-12', hasRuler: true }],
  words: 'Graded twice.',
}
const shipping = { packing: 'foam-38-overnight', boxCents: 1200, mostInBox: 100, days: ['mon', 'tue'] }
const edit = (change: Record<string, unknown>) => effectOfEdit(approved, { ...approved, ...change })

describe('editing an approved listing', () => {
  it.each([
    ['another species', { taxonId: 'nile_tilapia' }],
    ['a strain that was not named', { strain: 'Ohio white' }],
    ['another origin', { origin: 'bought-in', originState: 'IN' }],
    ['a treatment', { health: { treatments: 'Salt, 3 days', lastLosses: 'None' } }],
    ['another hatch date', { hatchedOn: '2026-10-02' }],
    ['shipping that was not offered', { shipping }],
    ['a lower price together with another species', { taxonId: 'bluegill', tiers: [] }],
  ])('hides it for %s', (_, change) => expect(edit(change)).toBe('hide'))

  it.each([
    ['new words', { words: 'Graded three times.' }],
    ['another photo', { photos: [] }],
    ['a larger size', { sizeLoMm: 76.2 }],
    ['one more state', { statesServed: ['OH', 'KY', 'IN'] }],
    ['a field nobody has heard of', { sparkle: true }],
  ])('keeps the approved version on sale while somebody reads %s', (_, change) =>
    expect(edit(change)).toBe('wait'),
  )

  it.each([
    ['a lower price', { tiers: [{ fromCount: 25, unitCents: 90 }] }],
    ['a higher price', { tiers: [{ fromCount: 25, unitCents: 120 }] }],
    ['other pickup windows', { windows: [] }],
    ['a fresh water reading', { water: { temperatureC: 23, pH: 7.4 } }],
    ['fewer states', { statesServed: ['OH'] }],
    ['a ready date', { readyOn: '2027-02-01' }],
  ])('goes live at once with %s', (_, change) => expect(edit(change)).toBe('live'))

  it.each([
    ['another packing', { packing: 'carton-overnight' }],
    ['another box charge', { boxCents: 1500 }],
    ['another ship day', { days: ['mon'] }],
  ])('hides a shipped listing for %s, and lets it stop shipping at once', (_, change) => {
    const shipped = { ...approved, shipping }
    expect(effectOfEdit(shipped, { ...shipped, shipping: { ...shipping, ...change } })).toBe('hide')
    expect(effectOfEdit(shipped, approved)).toBe('live')
  })

  it('finds nothing to do when the same is said in another order', () => {
    expect(edit({ water: { pH: 7.4, temperatureC: 22 } })).toBeNull()
  })
})

describe('two versions side by side', () => {
  it('says what was and what is, in words, hiding changes first', () => {
    const after = {
      ...approved,
      words: 'Graded.',
      sizeLoMm: 57.15,
      taxonId: 'nile_tilapia',
      tiers: [{ fromCount: 25, unitCents: 95 }],
      readyOn: '2027-02-01',
    }
    expect(compareBodies(approved, after)).toEqual([
      { field: 'taxonId', before: 'blue_tilapia', after: 'nile_tilapia', material: true },
      { field: 'sizeLoMm', before: '2 in', after: '2¼ in', material: false },
      { field: 'tiers', before: 'from 25: $1.00; from 100: $0.89', after: 'from 25: $0.95', material: false },
      { field: 'words', before: 'Graded twice.', after: 'Graded.', material: false },
      { field: 'readyOn', before: '', after: '2027-02-01', material: false },
    ])
  })

  it('prints how it is shipped', () => {
    const told = compareBodies(approved, { ...approved, shipping }).map(({ field, after }) => [field, after])
    expect(told).toEqual([
      ['shipping.packing', 'foam-38-overnight'],
      ['shipping.boxCents', '$12.00'],
      ['shipping.mostInBox', '100'],
      ['shipping.days', 'Mon, Tue'],
    ])
  })

  it('prints windows, photos, temperatures and ticks readably', () => {
    const after = {
      ...approved,
      water: { temperatureC: 25, pH: 7.4 },
      windows: [],
      photos: [{ photoId: 'bc'.repeat(16), takenOn: '2027-01-13', hasRuler: false, caption: 'In the net' }],
      singleSpeciesChecked: true,
    }
    const told = Object.fromEntries(compareBodies(approved, after).map((c) => [c.field, [c.before, c.after]]))
    expect(told['windows']).toEqual(['2027-01-23 09:00 to 10:00 (6)', ''])
    expect(told['photos']).toEqual(['aaaaaa 2027-01-12 ruler', 'bcbcbc 2027-01-13 In the net'])
    expect(told['water.temperatureC']).toEqual(['72 °F (22 °C)', '77 °F (25 °C)'])
    expect(told['singleSpeciesChecked']).toEqual(['', 'yes'])
  })
})
