/** `unknown` is the default: where no row speaks, nobody has checked. */
export type RuleStatus =
  | 'allowed'
  | 'allowed_with_conditions'
  | 'permit_buyer'
  | 'permit_seller'
  | 'permit_both'
  | 'unknown'
  | 'prohibited'

/** `stock` is stocking outdoors; `import` is bringing across the line into a state. */
export type RuleActivity = 'sell' | 'culture' | 'transport' | 'possess' | 'import' | 'stock'

export const ruleActivities: readonly RuleActivity[] = [
  'sell',
  'culture',
  'transport',
  'possess',
  'import',
  'stock',
]

/** P read in the primary text, S secondary text, H hearsay, D demonstration only. */
export type RuleConfidence = 'P' | 'S' | 'H' | 'D'

/** What somebody read about one taxon in one place. A change makes a new version, never an overwrite. */
export interface SpeciesRule {
  ruleKey: string
  version: number
  taxonId: string
  /** 'US' or a two-letter state. */
  jurisdiction: string
  /** Set when the rule holds in a part of the state only. */
  areaText: string | null
  activities: readonly RuleActivity[]
  status: RuleStatus
  /** Each is ticked by the buyer, word for word. */
  conditions: readonly string[]
  papersNeeded: readonly string[]
  sourceTitle: string
  sourceUrl: string | null
  /** Of the text, as far as known: a date, a year, 'undated'. */
  sourceDate: string
  /** ISO days. */
  checkedOn: string
  reviewDue: string
  confidence: RuleConfidence
  active: boolean
}

/** Past its review day a row counts as unknown, however sure it once was. ISO days. */
export function isOverdue(rule: SpeciesRule, today: string): boolean {
  return today > rule.reviewDue
}

/** Only what was read in the primary text decides; demonstration rows decide for the demonstration. */
export function isEffective(rule: SpeciesRule): boolean {
  return rule.active && (rule.confidence === 'P' || rule.confidence === 'D')
}
