import type { PartyReading } from '@/shared/domain/rules/read-parties'
import {
  isOverdue,
  type RuleActivity,
  type RuleStatus,
  type SpeciesRule,
} from '@/shared/domain/rules/species-rule'

export interface GateReason {
  ruleKey: string
  version: number
  jurisdiction: string
  activity: RuleActivity
  /** As the row says it; an overdue row counted as unknown. */
  status: RuleStatus
  sourceTitle: string
  sourceUrl?: string
  sourceDate: string
  checkedOn: string
  confidence: SpeciesRule['confidence']
  overdue: boolean
  /** Secondary text or hearsay: shown, without weight. */
  hint: boolean
}

/** The rows behind a judgement, one entry per row and activity, deciding rows before hints. */
export function listReasons(readings: readonly PartyReading[], today: string): GateReason[] {
  const deciding = readings.flatMap((one) => one.rows.map((row) => reason(row, one.activity, today)))
  const hints = readings.flatMap((one) =>
    one.hints.map((row) => ({ ...reason(row, one.activity, today), hint: true })),
  )
  return [...deciding, ...hints]
}

function reason(row: SpeciesRule, activity: RuleActivity, today: string): GateReason {
  const { ruleKey, version, jurisdiction, status, sourceTitle, sourceDate, checkedOn, confidence } = row
  return {
    ruleKey,
    version,
    jurisdiction,
    activity,
    status,
    sourceTitle,
    ...(row.sourceUrl === null ? {} : { sourceUrl: row.sourceUrl }),
    sourceDate,
    checkedOn,
    confidence,
    overdue: isOverdue(row, today),
    hint: false,
  }
}
