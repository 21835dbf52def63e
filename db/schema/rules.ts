import { boolean, date, index, int, mysqlTable, smallint, uniqueIndex, varchar } from 'drizzle-orm/mysql-core'

import { instant, jsonOf, memberRef } from '@/db/schema/columns'
import type { RuleEvidence } from '@/shared/contracts/rules'

/** What somebody read about one taxon in one state: who said so, when, how sure. Never overwritten. */
export const speciesRule = mysqlTable(
  'species_rule',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    ruleKey: varchar({ length: 60 }).notNull(),
    version: smallint({ unsigned: true }).notNull().default(1),
    taxonId: varchar({ length: 60 }).notNull(),
    jurisdiction: varchar({ length: 2 }).notNull(),
    areaText: varchar({ length: 160 }),
    activities: jsonOf<string[]>().notNull(),
    status: varchar({ length: 24 }).notNull(),
    conditions: jsonOf<string[]>().notNull(),
    papersNeeded: jsonOf<string[]>().notNull(),
    sourceTitle: varchar({ length: 200 }).notNull(),
    sourceUrl: varchar({ length: 300 }),
    sourceDate: varchar({ length: 40 }).notNull(),
    checkedOn: date({ mode: 'string' }).notNull(),
    reviewDue: date({ mode: 'string' }).notNull(),
    /** P read in the primary text, S secondary, H hearsay, D demonstration only. */
    confidence: varchar({ length: 1 }).notNull(),
    active: boolean().notNull().default(true),
    createdBy: memberRef(),
    createdAt: instant().notNull(),
  },
  (t) => [
    uniqueIndex('u_rule_version').on(t.ruleKey, t.version),
    index('k_rule_place').on(t.jurisdiction, t.taxonId),
  ],
)

/** What was shown and ticked when an order was made, with the rule versions behind it. */
export const ruleEvidence = mysqlTable(
  'rule_evidence',
  {
    id: int({ unsigned: true }).autoincrement().primaryKey(),
    orderId: int({ unsigned: true }).notNull(),
    memberId: memberRef().notNull(),
    party: varchar({ length: 8 }).notNull(),
    shown: jsonOf<RuleEvidence>().notNull(),
    at: instant().notNull(),
  },
  (t) => [index('k_evidence_order').on(t.orderId)],
)
