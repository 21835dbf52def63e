import { describe, expect, it } from 'vitest'

import { askGate, type GateAsked } from '@/server/rules/ask-gate'
import { hiddenStates } from '@/server/rules/hidden-states'
import { presentGate } from '@/server/rules/present-gate'
import { demoRules } from '@/shared/domain/rules/demo-rules.facts'
import { speciesRules } from '@/shared/domain/rules/species-rules.facts'
import { stateBit } from '@/shared/domain/rules/state-bits'

const today = '2027-01-15'
const rules = [...speciesRules, ...demoRules]
const asked = (taxonId: string, change: Partial<GateAsked> = {}): GateAsked => ({
  body: { category: 'fish', taxonId, licenceNumbers: 'Class A 1142' },
  sellerState: 'OH',
  buyerState: 'OH',
  viewer: 'buyer',
  ...change,
})
const gate = (given: GateAsked) => presentGate(askGate(given, rules, today), given)

describe('the gate in words', () => {
  it('serves neither Alaska nor Hawaii nor the territories with animals, whatever rules say', () => {
    for (const buyerState of ['AK', 'HI', 'PR']) {
      const verdict = gate(asked('bluegill', { buyerState }))
      expect(verdict).toMatchObject({ status: 'prohibited', buy: 'no', reasons: [], ticks: [] })
      expect(verdict.cautions[0]?.text).toMatch(/our own rule/)
    }
  })

  it('takes a licence number for a paper only once a moderator has read it', () => {
    expect(gate(asked('nile_tilapia')).buy).toBe('ticks')
    expect(gate(asked('nile_tilapia', { approved: false })).buy).toBe('reserve-only')
    const none = {
      category: 'fish',
      taxonId: 'nile_tilapia',
      licenceNumbers: 'none needed, indoor tanks',
    } as const
    expect(gate(asked('nile_tilapia', { body: none })).buy).toBe('reserve-only')
  })

  it('gives each side its own statements', () => {
    const buyer = gate(asked('bluegill')).ticks.map((tick) => tick.id)
    const seller = gate(asked('bluegill', { viewer: 'seller' })).ticks.map((tick) => tick.id)
    expect(buyer).toContain('never-release')
    expect(seller).not.toContain('never-release')
  })

  it('leaves no brace unfilled, for any animal and either side of a line', () => {
    for (const rule of demoRules) {
      for (const buyerState of ['OH', 'KY', 'IN', 'TX']) {
        const { cautions, ticks } = gate(asked(rule.taxonId, { buyerState }))
        for (const { text } of [...cautions, ...ticks]) expect(text).not.toMatch(/[{}]/)
      }
    }
  })
})

describe('states that are not shown a batch', () => {
  const hides = (taxonId: string, state: string) =>
    (hiddenStates(asked(taxonId), rules, today) & (stateBit(state) ?? 0n)) !== 0n

  it('are those where it is prohibited, and those we do not serve', () => {
    expect(hides('mozambique_hybrid_tilapia', 'IN')).toBe(true)
    expect(hides('mozambique_hybrid_tilapia', 'OH')).toBe(false)
    expect(hides('channel_catfish', 'CA')).toBe(true)
    expect(hides('bluegill', 'TX')).toBe(false)
    for (const state of ['AK', 'HI']) expect(hides('bluegill', state)).toBe(true)
  })

  it('are all of them for a blocked animal', () => {
    expect(hiddenStates(asked('northern_snakehead'), rules, today)).toBe((1n << 51n) - 1n)
  })

  it('are judged anew when a rule changes or its review day passes', () => {
    const own = rules.filter((rule) => rule.taxonId === 'mozambique_hybrid_tilapia')
    const batch = asked('mozambique_hybrid_tilapia')
    const indiana = stateBit('IN') ?? 0n
    expect(hiddenStates(batch, own, today) & indiana).toBe(indiana)
    expect(
      hiddenStates(
        batch,
        own.filter((rule) => rule.jurisdiction !== 'IN'),
        today,
      ) & indiana,
    ).toBe(0n)
    expect(hiddenStates(batch, own, '2100-01-01') & indiana).toBe(0n)
  })
})
