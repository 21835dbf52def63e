import { and, asc, eq, inArray } from 'drizzle-orm'

import { db, type Tx } from '@/db/client'
import { speciesRule } from '@/db/schema/rules'
import type {
  RuleActivity,
  RuleConfidence,
  RuleStatus,
  SpeciesRule,
} from '@/shared/domain/rules/species-rule'

type RuleRow = typeof speciesRule.$inferSelect

/** The columns hold the words of the rule table's own vocabulary; a test reads every starting row back. */
function ruleOf(row: RuleRow): SpeciesRule {
  return {
    ruleKey: row.ruleKey,
    version: row.version,
    taxonId: row.taxonId,
    jurisdiction: row.jurisdiction,
    areaText: row.areaText,
    activities: row.activities as RuleActivity[],
    status: row.status as RuleStatus,
    conditions: row.conditions,
    papersNeeded: row.papersNeeded,
    sourceTitle: row.sourceTitle,
    sourceUrl: row.sourceUrl,
    sourceDate: row.sourceDate,
    checkedOn: row.checkedOn,
    reviewDue: row.reviewDue,
    confidence: row.confidence as RuleConfidence,
    active: row.active,
  }
}

/** Active rows about any of these taxa; without `jurisdictions`, everywhere. */
export async function loadRules(
  wanted: { taxonIds: string[]; jurisdictions?: string[] },
  tx: Tx = db(),
): Promise<SpeciesRule[]> {
  if (wanted.taxonIds.length === 0) return []
  const rows = await tx
    .select()
    .from(speciesRule)
    .where(
      and(
        eq(speciesRule.active, true),
        inArray(speciesRule.taxonId, wanted.taxonIds),
        wanted.jurisdictions ? inArray(speciesRule.jurisdiction, wanted.jurisdictions) : undefined,
      ),
    )
    .orderBy(asc(speciesRule.id))
  return rows.map(ruleOf)
}
