import * as fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { judgeGate } from '@/shared/domain/rules/gate'
import type { GateQuestion } from '@/shared/domain/rules/gate-question'
import {
  ruleActivities,
  type RuleConfidence,
  type RuleStatus,
  type SpeciesRule,
} from '@/shared/domain/rules/species-rule'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

const today = '2027-01-15'

function lineage(taxonId: string) {
  const traced = traceLineage(taxonId)
  if (!traced) throw new Error(`no taxon ${taxonId}`)
  return traced
}

function row(given: Partial<SpeciesRule>): SpeciesRule {
  return {
    ruleKey: `row-${given.jurisdiction ?? 'OH'}-${given.taxonId ?? 'bluegill'}-${given.status ?? 'allowed'}`,
    version: 1,
    taxonId: 'bluegill',
    jurisdiction: 'OH',
    areaText: null,
    activities: ruleActivities,
    status: 'allowed',
    conditions: [],
    papersNeeded: [],
    sourceTitle: 'A state page',
    sourceUrl: null,
    sourceDate: '2026',
    checkedOn: '2026-11-15',
    reviewDue: '2027-11-15',
    confidence: 'P',
    active: true,
    ...given,
  }
}

function ask(given: Partial<GateQuestion> & { taxonId?: string }) {
  const { taxonId = 'bluegill', ...rest } = given
  return judgeGate({
    taxon: lineage(taxonId),
    rules: [],
    sellerState: 'OH',
    handOverState: 'OH',
    buyerState: 'OH',
    crossesLine: false,
    today,
    viewer: 'buyer',
    ...rest,
  })
}

const acrossLine = { handOverState: 'OH', buyerState: 'KY', crossesLine: true } as const
const bothStates = (given: Partial<SpeciesRule>) => [
  row({ ...given, jurisdiction: 'OH' }),
  row({ ...given, jurisdiction: 'KY' }),
]

// Written from the published table of effects, on purpose without a look at the code: same state, then across a line.
const table: Record<RuleStatus, [same: string, across: string]> = {
  allowed: ['yes', 'ticks'],
  allowed_with_conditions: ['ticks', 'ticks'],
  permit_buyer: ['reserve-only', 'reserve-only'],
  permit_seller: ['reserve-only', 'reserve-only'],
  permit_both: ['reserve-only', 'reserve-only'],
  unknown: ['explicit-unknown', 'ask-moderators'],
  prohibited: ['no', 'no'],
}
const statuses = Object.keys(table) as RuleStatus[]
const anyStatus = fc.constantFrom(...statuses)
const anyCase = fc.record({
  status: anyStatus,
  crosses: fc.boolean(),
  isStale: fc.boolean(),
  confidence: fc.constantFrom<RuleConfidence>('P', 'S', 'H', 'D'),
})

describe('the legal gate: one status everywhere', () => {
  it('follows the table of effects for every status, place, age and confidence', () => {
    fc.assert(
      fc.property(anyCase, ({ status, crosses, isStale, confidence }) => {
        const rules = bothStates({ status, confidence, reviewDue: isStale ? '2027-01-14' : today })
        const judged = ask({ rules, ...(crosses ? acrossLine : {}) })
        const decides = (confidence === 'P' || confidence === 'D') && !isStale
        const expected = decides ? status : 'unknown'
        expect(judged.status).toBe(expected)
        expect(judged.effect.buy).toBe(table[expected][crosses ? 1 : 0])
        expect(judged.effect.visible).toBe(expected !== 'prohibited')
        expect(judged.demonstration).toBe(confidence === 'D')
        expect(judged.reasons.every((one) => one.overdue === isStale)).toBe(true)
      }),
      { numRuns: 400 },
    )
  })

  it('says unknown where no row speaks, and names the gaps', () => {
    const judged = ask({})
    expect(judged.status).toBe('unknown')
    expect(judged.gaps).toEqual([
      { jurisdiction: 'OH', activity: 'sell' },
      { jurisdiction: 'OH', activity: 'transport' },
      { jurisdiction: 'OH', activity: 'possess' },
    ])
    expect(judged.ticks.map((tick) => tick.id)).toEqual(['never-release', 'nobody-checked'])
    expect(judged.ticks[1]?.text).toContain('Ohio')
    expect(judged.sellerTicks.map((tick) => tick.id)).toEqual(['nobody-checked'])
  })

  it('lets hearsay hint but never decide', () => {
    const judged = ask({ rules: [row({ confidence: 'H', status: 'allowed' })] })
    expect(judged.status).toBe('unknown')
    expect(judged.reasons.every((one) => one.hint)).toBe(true)
  })

  it('ignores withdrawn rows', () => {
    expect(ask({ rules: [row({ active: false })] }).reasons).toEqual([])
  })
})

describe('the legal gate: worst of three places', () => {
  const badness = ['allowed', 'allowed_with_conditions', 'permit', 'unknown', 'prohibited']
  const rank = (status: RuleStatus) => badness.indexOf(status.startsWith('permit') ? 'permit' : status)

  it('takes the worst of seller, hand-over and buyer across a line', () => {
    fc.assert(
      fc.property(anyStatus, anyStatus, anyStatus, (ohio, kentucky, indiana) => {
        const rules = [
          row({ jurisdiction: 'OH', status: ohio }),
          row({ jurisdiction: 'KY', status: kentucky }),
          row({ jurisdiction: 'IN', status: indiana }),
        ]
        const judged = ask({ rules, handOverState: 'KY', buyerState: 'IN', crossesLine: true })
        expect(rank(judged.status)).toBe(Math.max(rank(ohio), rank(kentucky), rank(indiana)))
      }),
    )
  })

  it('asks for both permits when each side needs one', () => {
    const rules = [
      row({ jurisdiction: 'OH', status: 'permit_seller' }),
      row({ jurisdiction: 'KY', status: 'permit_buyer' }),
    ]
    expect(ask({ rules, ...acrossLine }).status).toBe('permit_both')
  })

  it('asks about importing only across a line', () => {
    const rules = [
      ...bothStates({}),
      row({ jurisdiction: 'KY', activities: ['import'], status: 'prohibited' }),
    ]
    expect(ask({ rules, ...acrossLine }).status).toBe('prohibited')
    const inKentucky = { sellerState: 'KY', handOverState: 'KY', buyerState: 'KY' }
    expect(ask({ rules, ...inKentucky }).status).toBe('allowed')
  })

  it('never reads silence on one activity as leave, when another is allowed', () => {
    const rules = [row({ activities: ['sell', 'transport'] })]
    expect(ask({ rules }).status).toBe('unknown')
  })

  it('counts outdoor stocking and culture only where a row speaks of them', () => {
    const core = row({ activities: ['sell', 'transport', 'possess'] })
    expect(ask({ rules: [core] }).status).toBe('allowed')
    expect(ask({ rules: [core, row({ activities: ['stock'], status: 'permit_buyer' })] }).status).toBe(
      'permit_buyer',
    )
  })

  it('adds the nation to the states', () => {
    const nation = row({ jurisdiction: 'US', activities: ['sell'], status: 'permit_seller' })
    expect(ask({ rules: [row({}), nation] }).status).toBe('permit_seller')
  })

  it('inside one state keeps the permit and still says what nobody checked', () => {
    const judged = ask({ rules: [row({ activities: ['sell'], status: 'permit_seller' })] })
    expect(judged.status).toBe('permit_seller')
    expect(judged.effect.buy).toBe('reserve-only')
    expect(judged.ticks.map((tick) => tick.id)).toContain('nobody-checked')
    expect(judged.cautions).toContain('G-3')
  })
})

describe('the legal gate: which row speaks', () => {
  it('prefers the most specific taxon', () => {
    const genus = row({ taxonId: 'lepomis', status: 'prohibited' })
    expect(ask({ rules: [genus] }).status).toBe('prohibited')
    expect(ask({ rules: [genus, row({})] }).status).toBe('allowed')
  })

  it('takes the worse of two rows about the same taxon', () => {
    expect(ask({ rules: [row({}), row({ status: 'prohibited' })] }).status).toBe('prohibited')
  })

  it('counts a rule for a part of the state for all of it, as long as nobody knows the county', () => {
    const part = row({ areaText: 'two counties', status: 'prohibited' })
    expect(ask({ rules: [row({}), part] }).status).toBe('prohibited')
    expect(ask({ rules: [row({ areaText: 'two counties' })] }).status).toBe('unknown')
  })

  it('gives a cross the worse status of its parents', () => {
    const parent = row({ taxonId: 'green_sunfish', status: 'prohibited' })
    const good = row({ taxonId: 'bluegill' })
    expect(ask({ taxonId: 'hybrid_bluegill', rules: [parent, good] }).status).toBe('prohibited')
    expect(ask({ taxonId: 'hybrid_bluegill', rules: [good] }).status).toBe('unknown')
    const own = row({ taxonId: 'hybrid_bluegill' })
    expect(ask({ taxonId: 'hybrid_bluegill', rules: [own, good] }).status).toBe('allowed')
    expect(ask({ taxonId: 'hybrid_bluegill', rules: [own, parent] }).status).toBe('prohibited')
  })
})

describe('the legal gate: papers and statements', () => {
  it('opens once the papers of whoever needs one are accepted', () => {
    const rules = [row({ status: 'permit_both', papersNeeded: ['A permit'] })]
    const buy = (acceptedPapers: GateQuestion['acceptedPapers']) => ask({ rules, acceptedPapers }).effect.buy
    expect([buy([]), buy(['buyer']), buy(['seller']), buy(['buyer', 'seller'])]).toEqual([
      'reserve-only',
      'reserve-only',
      'reserve-only',
      'ticks',
    ])
    expect(ask({ rules, acceptedPapers: ['buyer', 'seller'] }).status).toBe('permit_both')
    expect(ask({ rules }).papersNeeded).toEqual(['A permit'])
  })

  it('has the buyer tick each condition and both sides the crossing', () => {
    const rules = bothStates({ status: 'allowed_with_conditions', conditions: ['An indoor tank.'] })
    const judged = ask({ rules, ...acrossLine })
    expect(judged.ticks.map((tick) => tick.text)).toEqual([
      expect.stringContaining('Never let these animals'),
      expect.stringContaining('across a state line'),
      'An indoor tank.',
      'An indoor tank.',
    ])
    expect(judged.sellerTicks.map((tick) => tick.id)[0]).toBe('crossing')
    expect(judged.papersNeeded).toEqual(['Papers for the route, attached by the seller'])
  })

  it('asks salmonids for health papers across a line', () => {
    const rules = bothStates({ taxonId: 'rainbow_trout' })
    expect(ask({ taxonId: 'rainbow_trout', rules, ...acrossLine }).papersNeeded).toEqual([
      'Salmonid health papers for Kentucky',
    ])
  })

  it('shows a prohibited listing to its seller and the staff only', () => {
    const rules = [row({ status: 'prohibited' })]
    const visible = (['visitor', 'buyer', 'seller', 'staff'] as const).map(
      (viewer) => ask({ rules, viewer }).effect.visible,
    )
    expect(visible).toEqual([false, false, true, true])
    expect(ask({ rules, viewer: 'staff' }).effect.buy).toBe('no')
  })
})
