import { describe, expect, it } from 'vitest'
import { blockList } from '@/shared/domain/rules/block-list.facts'
import { demoRules, demonstrationTitle } from '@/shared/domain/rules/demo-rules.facts'
import { judgeGate } from '@/shared/domain/rules/gate'
import type { GateQuestion } from '@/shared/domain/rules/gate-question'
import { ruleFromFacts } from '@/shared/domain/rules/rule-facts'
import { ruleActivities, type SpeciesRule } from '@/shared/domain/rules/species-rule'
import { speciesRules } from '@/shared/domain/rules/species-rules.facts'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

const acrossLine = { handOverState: 'OH', buyerState: 'KY', crossesLine: true } as const

/** A row that allows everything in Ohio, to show that it cannot outweigh a block. */
function allowing(taxonId: string): SpeciesRule {
  const template = ruleFromFacts({
    taxonId: 'bluegill',
    jurisdiction: 'OH',
    activities: ruleActivities,
    status: 'allowed',
    sourceKey: 'house-rule',
    sourceDate: '2026',
    confidence: 'P',
  })
  return { ...template, taxonId }
}

function ask({ taxonId, ...given }: Partial<GateQuestion> & { taxonId: string }) {
  const taxon = traceLineage(taxonId)
  if (!taxon) throw new Error(`no taxon ${taxonId}`)
  return judgeGate({
    taxon,
    rules: [],
    sellerState: 'OH',
    handOverState: 'OH',
    buyerState: 'OH',
    crossesLine: false,
    today: '2027-01-15',
    viewer: 'buyer',
    ...given,
  })
}

describe('the national block list', () => {
  it('refuses each entry whatever any rule says, as our own policy', () => {
    for (const { taxonId } of blockList) {
      const judged = ask({ taxonId, rules: [allowing(taxonId)] })
      expect([taxonId, judged.effect.buy, judged.effect.visible]).toEqual([taxonId, 'no', false])
      expect(judged.cautions).toEqual(['G-4', 'G-13'])
      expect(judged.policy).not.toBeNull()
    }
  })

  it.each(['walking_catfish', 'striped_snakehead', 'african_catfish'])('reaches down to %s', (taxonId) =>
    expect(ask({ taxonId }).effect.buy).toBe('no'),
  )

  it.each(['yellow_perch', 'walleye', 'channel_catfish', 'redclaw_crayfish', 'goldfish', 'grass_carp'])(
    'leaves the look-alike %s alone',
    (taxonId) => expect(ask({ taxonId }).policy).toBeNull(),
  )

  it('keeps water spinach inside its state, with a paper', () => {
    expect(ask({ taxonId: 'water_spinach', ...acrossLine }).effect.buy).toBe('no')
    const judged = ask({ taxonId: 'water_spinach', rules: [allowing('water_spinach')] })
    expect(judged.effect.buy).toBe('reserve-only')
    expect(judged.papersNeeded).toEqual(['State permit or licence to grow and sell water spinach'])
    expect(judged.ticks).toEqual([])
  })
})

describe('the rows the product starts with', () => {
  const all = [...speciesRules, ...demoRules]
  const anywhere = (taxonId: string, state: string) =>
    ask({ taxonId, rules: all, sellerState: state, handOverState: state, buyerState: state })

  it('gives each row a key of its own that fits its column', () => {
    const keys = all.map((rule) => rule.ruleKey)
    expect(new Set(keys).size).toBe(keys.length)
    for (const rule of all) {
      expect(rule.ruleKey.length).toBeLessThanOrEqual(60)
      expect(rule.sourceTitle.length).toBeLessThanOrEqual(200)
      expect(findTaxon(rule.taxonId)).not.toBeNull()
    }
  })

  it('marks demonstration rows by title and confidence, and keeps them out of the real ones', () => {
    for (const rule of demoRules)
      expect([rule.sourceTitle, rule.confidence]).toEqual([demonstrationTitle, 'D'])
    for (const rule of speciesRules) expect(rule.confidence).not.toBe('D')
  })

  it('lets no demonstration row talk over a primary one', () => {
    for (const rule of demoRules) {
      const line = traceLineage(rule.taxonId)?.self ?? []
      const primary = speciesRules.filter(
        (other) =>
          other.confidence === 'P' &&
          other.jurisdiction === rule.jurisdiction &&
          line.includes(other.taxonId),
      )
      const overlap = primary.flatMap((other) =>
        other.activities.filter((one) => rule.activities.includes(one)),
      )
      expect([rule.ruleKey, overlap]).toEqual([rule.ruleKey, []])
    }
  })

  it('shows every outcome in the three states of the demonstration', () => {
    const across = ask({
      taxonId: 'blue_tilapia',
      rules: all,
      sellerState: 'KY',
      buyerState: 'IN',
      crossesLine: true,
    })
    expect([
      anywhere('bluegill', 'KY').effect.buy,
      anywhere('nile_tilapia', 'KY').effect.buy,
      anywhere('nile_tilapia', 'IN').effect.buy,
      anywhere('mozambique_hybrid_tilapia', 'KY').effect.buy,
      across.effect.buy,
      anywhere('mozambique_hybrid_tilapia', 'IN').effect.buy,
    ]).toEqual(['yes', 'ticks', 'reserve-only', 'explicit-unknown', 'ask-moderators', 'no'])
  })

  it('lets an Ohio seller with accepted papers sell Nile tilapia in Ohio', () => {
    const judged = ask({ taxonId: 'nile_tilapia', rules: all, acceptedPapers: ['seller'] })
    expect([judged.status, judged.effect.buy]).toEqual(['permit_seller', 'ticks'])
    expect(judged.demonstration).toBe(true)
  })

  it('reads the primary rows as they were written down', () => {
    expect(anywhere('nile_tilapia', 'TX').status).toBe('permit_both')
    expect(anywhere('red_hybrid_tilapia', 'LA').status).toBe('permit_both')
    expect(anywhere('marbled_crayfish', 'VA').status).toBe('prohibited')
    expect(anywhere('nile_tilapia', 'AZ').status).toBe('unknown')
    const toCalifornia = { sellerState: 'NV', handOverState: 'CA', buyerState: 'CA', crossesLine: true }
    expect(ask({ taxonId: 'channel_catfish', rules: all, ...toCalifornia }).status).toBe('prohibited')
    expect(ask({ taxonId: 'hybrid_catfish', rules: all, ...toCalifornia }).status).toBe('prohibited')
  })
})
