import { inArray, sql } from 'drizzle-orm'

import type { Database } from '@/db/client'
import { speciesRule } from '@/db/schema/rules'
import { demoRules } from '@/shared/domain/rules/demo-rules.facts'
import { speciesRules } from '@/shared/domain/rules/species-rules.facts'
import type { SpeciesRule } from '@/shared/domain/rules/species-rule'

type NewRule = typeof speciesRule.$inferInsert

function rowOf(rule: SpeciesRule, createdAt: Date): NewRule {
  return {
    ...rule,
    activities: [...rule.activities],
    conditions: [...rule.conditions],
    papersNeeded: [...rule.papersNeeded],
    createdAt,
  }
}

/**
 * Version 1 of every rule we hold; versions that are there already are never touched. Demonstration rows only where a
 * demonstration is asked for, which production refuses.
 */
export async function loadRules(db: Database, options: { demonstration: boolean; at: Date }): Promise<void> {
  const rules = options.demonstration ? [...speciesRules, ...demoRules] : [...speciesRules]
  if (rules.length === 0) return
  const keys = rules.map((rule) => rule.ruleKey)
  const there = await db
    .select({ ruleKey: speciesRule.ruleKey })
    .from(speciesRule)
    .where(inArray(speciesRule.ruleKey, keys))
  const known = new Set(there.map((row) => row.ruleKey))
  const missing = rules.filter((rule) => !known.has(rule.ruleKey)).map((rule) => rowOf(rule, options.at))
  if (missing.length === 0) return
  // Two starts at once write the same first version: the second changes nothing.
  await db
    .insert(speciesRule)
    .values(missing)
    .onDuplicateKeyUpdate({ set: { version: sql`${speciesRule.version}` } })
}
