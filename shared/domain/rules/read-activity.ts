import {
  isEffective,
  isOverdue,
  type RuleActivity,
  type RuleStatus,
  type SpeciesRule,
} from '@/shared/domain/rules/species-rule'
import { worstStatus } from '@/shared/domain/rules/worst-status'
import type { TaxonLineage } from '@/shared/domain/species/trace-lineage'

export interface ActivityReading {
  activity: RuleActivity
  jurisdiction: string
  status: RuleStatus
  /** The rows that decided. */
  rows: readonly SpeciesRule[]
  /** Secondary texts and hearsay: shown, never deciding. */
  hints: readonly SpeciesRule[]
  /** No deciding row at all. */
  isMissing: boolean
}

interface Question {
  rules: readonly SpeciesRule[]
  jurisdiction: string
  activity: RuleActivity
  today: string
  crossesLine: boolean
}

/** What the rows say of one activity in one jurisdiction. A cross takes the worse of its parents. */
export function readActivity(taxon: TaxonLineage, question: Question): ActivityReading {
  const { jurisdiction, activity, crossesLine } = question
  const spoken = question.rules.filter(
    (rule) => rule.active && rule.jurisdiction === jurisdiction && rule.activities.includes(activity),
  )
  const own = readLine(taxon.self, spoken, question)
  const parents = taxon.hybridParents.map((line) => readLine(line, spoken, question))
  // A row on the cross itself (or above it) answers for a parent nobody has read about, never for a known bad one.
  const counted = own.isMissing
    ? parents.length > 0
      ? parents
      : [own]
    : [own, ...parents.filter((one) => !one.isMissing)]
  const everyTaxon = new Set([...taxon.self, ...taxon.hybridParents.flat()])
  return {
    activity,
    jurisdiction,
    status: worstStatus(
      counted.map((one) => one.status),
      crossesLine,
    ),
    rows: [...new Set(counted.flatMap((one) => one.rows))],
    hints: spoken.filter((rule) => !isEffective(rule) && everyTaxon.has(rule.taxonId)),
    isMissing: counted.every((one) => one.isMissing),
  }
}

function readLine(line: readonly string[], spoken: readonly SpeciesRule[], { today, crossesLine }: Question) {
  const effective = spoken.filter((rule) => isEffective(rule) && line.includes(rule.taxonId))
  const distance = (rule: SpeciesRule) => line.indexOf(rule.taxonId)
  const statewide = effective.filter((rule) => rule.areaText === null)
  const nearest = Math.min(...statewide.map(distance), line.length)
  // Nobody's county is known here, so a rule for a part of the state may bind as well as the one for the rest.
  const partial = effective.filter((rule) => rule.areaText !== null && distance(rule) <= nearest)
  const rows = [...statewide.filter((rule) => distance(rule) === nearest), ...partial]
  const statuses = rows.map((rule): RuleStatus => (isOverdue(rule, today) ? 'unknown' : rule.status))
  if (nearest === line.length) statuses.push('unknown')
  return { status: worstStatus(statuses, crossesLine), rows, isMissing: rows.length === 0 }
}
