import { ruleFromFacts, type RuleFacts } from '@/shared/domain/rules/rule-facts'
import {
  ruleActivities,
  type RuleActivity,
  type RuleStatus,
  type SpeciesRule,
} from '@/shared/domain/rules/species-rule'
import type { TaxonId } from '@/shared/domain/species/taxa.facts'

// Invented, for three states that meet in one valley, so that every outcome of the gate can be seen. Seeded only
// outside production; every page that uses one says so. 'none' leaves a state silent.
type Planned = RuleStatus | 'none'
type Row = readonly [TaxonId, ohio: Planned, kentucky: Planned, indiana: Planned]

// prettier-ignore
const plan: readonly Row[] = [
  ['nile_tilapia', 'allowed', 'allowed_with_conditions', 'permit_buyer'],
  ['blue_tilapia', 'allowed', 'permit_buyer', 'none'],
  ['mozambique_hybrid_tilapia', 'allowed_with_conditions', 'none', 'prohibited'],
  ['bluegill', 'allowed', 'allowed', 'allowed'],
  ['hybrid_bluegill', 'allowed', 'allowed', 'allowed'],
  ['yellow_perch', 'allowed', 'allowed', 'allowed_with_conditions'],
  ['largemouth_bass', 'allowed', 'permit_seller', 'allowed'],
  ['channel_catfish', 'allowed', 'allowed', 'allowed'],
  ['rainbow_trout', 'allowed_with_conditions', 'allowed', 'permit_buyer'],
  ['common_carp_koi', 'allowed', 'allowed', 'allowed'],
  ['goldfish', 'allowed', 'allowed', 'allowed'],
  ['fathead_minnow', 'allowed', 'allowed', 'allowed'],
  ['golden_shiner', 'allowed', 'allowed', 'none'],
  ['hybrid_striped_bass', 'allowed', 'allowed_with_conditions', 'allowed'],
  ['redclaw_crayfish', 'allowed_with_conditions', 'prohibited', 'none'],
  ['red_swamp_crayfish', 'prohibited', 'permit_both', 'none'],
  ['freshwater_prawn', 'allowed', 'allowed', 'allowed'],
  ['red_wiggler', 'allowed', 'allowed', 'allowed'],
  ['european_nightcrawler', 'allowed', 'allowed', 'allowed'],
  ['black_soldier_fly_larvae', 'allowed', 'allowed', 'allowed'],
]

const conditions = [
  'The animals live in an indoor tank.',
  'No water leaves the tank except to a sewer or onto land.',
]
const notFish = new Set<TaxonId>([
  'redclaw_crayfish',
  'red_swamp_crayfish',
  'freshwater_prawn',
  'red_wiggler',
  'european_nightcrawler',
  'black_soldier_fly_larvae',
])
// Ohio's primary rows speak of selling, culturing and importing fish; no demonstration row may talk over them.
const leftByOhio: readonly RuleActivity[] = ['transport', 'possess', 'stock']

/** Exactly the title every demonstration row carries; the seed refuses them in production by it. */
export const demonstrationTitle = 'Demonstration only, not a reading of any law'

function demoRow(taxonId: TaxonId, jurisdiction: string, status: RuleStatus): RuleFacts {
  const isLimited = jurisdiction === 'OH' && !notFish.has(taxonId)
  return {
    taxonId,
    jurisdiction,
    activities: isLimited ? leftByOhio : ruleActivities,
    status,
    conditions: status === 'allowed_with_conditions' ? conditions : [],
    sourceKey: 'demonstration',
    sourceDate: '2026',
    confidence: 'D',
    reviewDue: '2099-12-31',
  }
}

const planned = plan.flatMap(([taxonId, ohio, kentucky, indiana]) =>
  Object.entries({ OH: ohio, KY: kentucky, IN: indiana }).flatMap(([jurisdiction, status]) =>
    status === 'none' ? [] : [demoRow(taxonId, jurisdiction, status)],
  ),
)

/** One row past its review day, so that a stale reading can be seen too. */
const stale: RuleFacts = {
  ...demoRow('golden_shiner', 'IN', 'allowed'),
  checkedOn: '2025-09-01',
  reviewDue: '2026-09-01',
}

export const demoRules: readonly SpeciesRule[] = [...planned, stale].map(ruleFromFacts)
