import { describe, expect, it } from 'vitest'

import { batchDefaults } from './batch-defaults'
import { batchIssues } from './batch-issues'
import { draftFromTyping } from './draft-from-typing'
import { typingFromDraft } from './typing-from-draft'

import type { BatchTyping } from './batch-typing'
import type { FishBody } from '@/shared/contracts/fish-batch'

const base = batchDefaults({ ownState: 'OH', licenceNumbers: 'OH-A 1142' })

const body: FishBody = {
  category: 'fish',
  taxonId: 'bluegill',
  stage: 'fingerling',
  sizeLoMm: 50.8,
  sizeHiMm: 76.2,
  ungraded: false,
  hatchedOn: '2026-09-02',
  countOnHand: 2000,
  minOrder: 25,
  orderStep: 5,
  tiers: [
    { fromCount: 25, unitCents: 100 },
    { fromCount: 100, unitCents: 89 },
    { fromCount: 500, unitCents: 75 },
  ],
  countMethod: 'sample-weight',
  overcountPct: 5,
  sex: 'mixed',
  feed: { onPellets: true, words: '2 mm floating, 40 % protein' },
  water: {
    temperatureC: 22,
    pH: 7.4,
    ghPpm: 180,
    khPpm: 120,
    saltPpt: 0,
    source: 'well',
    measuredOn: '2027-01-12',
  },
  origin: 'hatched-here',
  wildCaught: false,
  health: { treatments: 'None', lastLosses: 'None' },
  singleSpeciesChecked: true,
  licenceNumbers: 'OH-A 1142',
  statesServed: ['OH', 'KY'],
  placeKind: 'farm-gate',
  windows: [{ day: '2027-01-23', from: '09:00', until: '10:00', capacity: 6 }],
  accept: 'ask',
  balanceDue: 'at-handover',
  depositPct: 25,
  freeCancelHours: 72,
  promise: { windowHours: 24, survivalDays: 0, remedy: 'refund', evidence: 'A photo of the dead fish' },
  photos: [{ photoId: 'a'.repeat(32), takenOn: '2027-01-12', hasRuler: true }],
  words: '',
}

const typed = (change: Partial<BatchTyping>) => ({
  ...typingFromDraft(body, { base, units: 'us' }),
  ...change,
})
const draftOf = (change: Partial<BatchTyping>) => draftFromTyping(typed(change), { was: body, units: 'us' })
const told = (change: Partial<BatchTyping>) =>
  Object.fromEntries(batchIssues(draftOf(change)).map((issue) => [issue.path.join('.'), issue.message]))

describe('a batch between the form and its draft', () => {
  it('comes back exactly as it was when nobody touched it, in either unit system', () => {
    for (const units of ['us', 'metric'] as const) {
      const typing = typingFromDraft(body, { base, units })
      expect(draftFromTyping(typing, { was: body, units })).toEqual(body)
    }
  })

  it('comes back with its shipping, and leaves it out where the switch is off', () => {
    const shipping = {
      packing: 'carton-two-days',
      boxCents: 1200,
      freightCents: 3800,
      carrier: 'Overnight by air',
      carrierAccepts: true,
      holdsAtCounter: false,
      mostInBox: 80,
      days: ['mon', 'tue'],
    } as const
    const shipped = { ...body, shipping: { ...shipping, days: [...shipping.days] } }
    const typing = typingFromDraft(shipped, { base, units: 'us' })
    expect(typing.shipping).toMatchObject({
      isOffered: true,
      boxCents: '$12.00',
      freightCents: '$38.00',
      carrierAccepts: true,
      days: ['mon', 'tue'],
    })
    expect(draftFromTyping(typing, { was: shipped, units: 'us' })).toEqual(shipped)
    const off = { ...typing, shipping: { ...typing.shipping, isOffered: false } }
    expect(draftFromTyping(off, { was: shipped, units: 'us' })).toEqual(body)
  })

  it('shows figures in the units of the seller', () => {
    expect(typingFromDraft(body, { base, units: 'us' })).toMatchObject({
      sizeLoMm: '2 in',
      countOnHand: '2,000',
      tiers: [{ unitCents: '$1.00' }, { unitCents: '$0.89' }, { unitCents: '$0.75' }],
      water: { temperatureC: '72 °F' },
      wildCaught: 'no',
    })
    expect(typingFromDraft(body, { base, units: 'metric' }).water.temperatureC).toBe('22 °C')
  })

  it('keeps what could not be read as it was typed', () => {
    const draft = draftOf({ sizeLoMm: 'about two' })
    expect(draft.sizeLoMm).toBe('about two')
    expect(typingFromDraft(draft, { base, units: 'us' }).sizeLoMm).toBe('about two')
  })

  it('fills a new draft with the usual practice, and never a statement only the seller can make', () => {
    const typing = typingFromDraft({}, { base, units: 'us' })
    expect(typing).toMatchObject({ depositPct: '25', statesServed: ['OH'], licenceNumbers: 'OH-A 1142' })
    expect(typing).toMatchObject({ singleSpeciesChecked: false, wildCaught: '', countMethod: '', origin: '' })
  })
})

describe('what is still missing', () => {
  it('has nothing to say about a whole batch', () => {
    expect(batchIssues(draftOf({}))).toEqual([])
  })

  it('asks how a shipped batch travels, and keeps two days on the way clear of the weekend', () => {
    const blank = {
      ...base.shipping,
      isOffered: true,
    }
    expect(told({ shipping: { ...blank, days: [] } })).toMatchObject({
      'shipping.packing': 'What do you pack them in, and how long is the way?',
      'shipping.carrierAccepts':
        'Ask your carrier whether it takes these animals in this service, then tick this.',
      'shipping.mostInBox': 'The most animals you put in one box.',
      'shipping.days': 'On which days do you ship?',
    })
    const way = {
      ...blank,
      ...{ boxCents: '12', freightCents: '38', carrier: 'Overnight by air', carrierAccepts: true },
      ...{ mostInBox: '80', days: ['tue', 'wed'] },
    }
    expect(told({ shipping: { ...way, packing: 'carton-overnight' } })).toEqual({})
    expect(told({ shipping: { ...way, packing: 'carton-two-days' } })).toEqual({
      'shipping.days': 'Two days on the way: ship on Monday or Tuesday, so that no box waits over a weekend.',
    })
  })

  it('refuses a price that does not fall, although other answers are still missing', () => {
    const change: Partial<BatchTyping> = {
      taxonId: '',
      photos: [],
      tiers: [
        { fromCount: '25', unitCents: '1.00' },
        { fromCount: '100', unitCents: '1.05' },
      ],
    }
    expect(told(change)).toMatchObject({
      taxonId: 'Pick the species from the list.',
      photos: 'At least one photo of this batch.',
      'tiers.1.unitCents': 'The price must fall as the count grows.',
    })
  })

  it('asks for every starred answer of an empty form', () => {
    const empty = draftFromTyping(typingFromDraft({}, { base, units: 'us' }), { was: {}, units: 'us' })
    const fields = new Set(batchIssues(empty).map((issue) => String(issue.path[0])))
    expect([...fields].sort()).toEqual(
      [
        'taxonId',
        'stage',
        'sizeLoMm',
        'sizeHiMm',
        'hatchedOn',
        'countOnHand',
        'tiers',
        'countMethod',
        'water',
        'origin',
        'wildCaught',
        'health',
        'singleSpeciesChecked',
        'windows',
        'photos',
      ].sort(),
    )
  })

  it('never blames a field that only met a lent answer', () => {
    expect(told({ minOrder: '', countOnHand: '' })).toEqual({
      minOrder: 'The smallest order.',
      countOnHand: 'How many are there to sell?',
    })
  })
})
