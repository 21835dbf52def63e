import type {
  RuleActivity,
  RuleConfidence,
  RuleStatus,
  SpeciesRule,
} from '@/shared/domain/rules/species-rule'
import type { TaxonId } from '@/shared/domain/species/taxa.facts'
import { sources, type SourceKey } from '@/shared/sources'

/** A rule row as it is written down here, before it becomes version 1 in the product's own table. */
export interface RuleFacts {
  taxonId: TaxonId
  jurisdiction: string
  areaText?: string
  activities: readonly RuleActivity[]
  status: RuleStatus
  conditions?: readonly string[]
  papersNeeded?: readonly string[]
  sourceKey: SourceKey
  sourceDate: string
  confidence: RuleConfidence
  checkedOn?: string
  reviewDue?: string
}

// The rows were copied from our notes on this day; each still needs one full reading of its text.
const copiedOn = '2026-11-15'
const twelveMonthsLater = '2027-11-15'

/** Version 1 of a row. The key names place, taxon, first activity and confidence, and is unique by test. */
export function ruleFromFacts(facts: RuleFacts): SpeciesRule {
  const { taxonId, jurisdiction, activities, status, confidence, sourceDate } = facts
  const source = sources[facts.sourceKey]
  return {
    ruleKey: `${jurisdiction}-${taxonId}-${activities[0] ?? 'none'}-${confidence}`.toLowerCase(),
    version: 1,
    taxonId,
    jurisdiction,
    areaText: facts.areaText ?? null,
    activities,
    status,
    conditions: facts.conditions ?? [],
    papersNeeded: facts.papersNeeded ?? [],
    sourceTitle: source.reading === 'own' ? source.title : `${source.author}: ${source.title}`,
    sourceUrl: null,
    sourceDate,
    checkedOn: facts.checkedOn ?? copiedOn,
    reviewDue: facts.reviewDue ?? twelveMonthsLater,
    confidence,
    active: true,
  }
}
