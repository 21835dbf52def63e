import { describe, expect, it } from 'vitest'

import { firstDraft, nextHarvest } from '@/components/selling/first-draft'
import { lotIssues } from './goods/lot-issues'
import { clay, redWigglers } from '@/shared/domain/listings/lots-for-tests'
import { supplyDraftOf, supplyTypingOf } from './supply-draft'

import type { SupplyKind } from './supply-kind'
import type { ProduceTyping, SupplyTyping } from './supply-typing'
import { lettuce } from '@/shared/contracts/lettuce-for-tests'
import type { ListingDraft } from '@/shared/contracts/listings'
import type { OwnSeller } from '@/shared/contracts/sellers'

const farm = {
  farmName: 'Millrace Greens',
  street: '4 Canal Rd',
  city: 'Dayton',
  state: 'OH',
  zip: '45402',
} as OwnSeller

const lots: [SupplyKind, ListingDraft][] = [
  ['produce', lettuce],
  ['produce', { ...lettuce, cropId: 'kale', saleUnit: { kind: 'weight', netG: 226.796185 } }],
  ['worms', redWigglers],
  ['media', clay],
]

describe.each(lots)('a lot of %s between the form and its draft', (kind, lot) => {
  it.each(['us', 'metric'] as const)('comes back exactly as it was when nobody touched it (%s)', (units) => {
    const typing = supplyTypingOf(kind, lot, units)
    expect(supplyDraftOf(typing, { kind, was: lot, units, farm })).toEqual(lot)
  })
})

describe('what is typed into a form of greens', () => {
  const typed = (change: Partial<ProduceTyping>): ListingDraft => {
    const typing = { ...(supplyTypingOf('produce', lettuce, 'us') as ProduceTyping), ...change }
    return supplyDraftOf(typing, { kind: 'produce', was: lettuce, units: 'us', farm })
  }
  const unit = (kind: string, netG: string): SupplyTyping['saleUnit'] => ({
    ...supplyTypingOf('produce', lettuce, 'us').saleUnit,
    kind,
    netG,
  })

  it('reads a net weight with its unit, and asks about a bare figure', () => {
    expect(typed({ saleUnit: unit('weight', '8 oz') }).saleUnit).toEqual({ kind: 'weight', netG: 226.796185 })
    const bare = typed({ saleUnit: unit('weight', '8') })
    expect(lotIssues('produce', bare).map(({ path }) => path.join('.'))).toEqual(['saleUnit.netG'])
  })

  it('leaves a weight out once it is sold by the head', () => {
    expect(typed({ saleUnit: unit('head', '8 oz') }).saleUnit).toEqual({ kind: 'head' })
  })

  it('gives the address of the farm away only for a qualified exempt farm', () => {
    expect(typed({})).not.toHaveProperty('farm')
    expect(typed({ standing: 'qualified-exempt' }).farm).toEqual({
      name: 'Millrace Greens',
      street: '4 Canal Rd',
      city: 'Dayton',
      state: 'OH',
      zip: '45402',
    })
  })
})

describe('what a new listing begins with', () => {
  const given = { ownState: 'OH', licenceNumbers: 'OH-A 1142' }

  it('remembers how the farm works, and nothing of the harvest before', () => {
    const draft = firstDraft('produce', { ...given, last: lettuce })
    expect(draft.handling).toEqual(lettuce.handling)
    expect(draft.standing).toBe('not-covered')
    for (const field of ['cropId', 'harvest', 'saleUnit', 'countOnHand', 'photos', 'windows', 'lotCode'])
      expect(draft).not.toHaveProperty(field)
  })

  it('asks greens to be paid at once, and serves worms to the own state', () => {
    expect(firstDraft('produce', { ...given, last: undefined }).depositPct).toBe(100)
    expect(firstDraft('worms', { ...given, last: undefined })).toMatchObject({
      statesServed: ['OH'],
      licenceNumbers: 'OH-A 1142',
    })
  })

  it('takes the bed over into the next harvest, but neither lot code nor count', () => {
    const next = nextHarvest({ ...lettuce, lotCode: 'L-0412-RAFT3' }, { day: '2027-04-19', time: '07:00' })
    expect(next.harvest).toEqual({ day: '2027-04-19', time: '07:00', bed: 'raft 3' })
    expect(next).not.toHaveProperty('lotCode')
    expect(next).not.toHaveProperty('countOnHand')
    expect(next.cropId).toBe('leaf_lettuce')
  })
})
