import { cautionTexts } from '@/shared/domain/rules/caution-texts.facts'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import { findState } from '@/shared/domain/rules/find-state'
import type { GateQuestion } from '@/shared/domain/rules/gate-question'
import type { PartyReading } from '@/shared/domain/rules/read-parties'
import { isOverdue } from '@/shared/domain/rules/species-rule'

/** A statement somebody ticks; the text is kept with the order as it was shown. */
export interface GateTick {
  id: string
  text: string
}

const crossing =
  'I know that moving an animal across a state line against a rule of either state can be a federal case for buyer and seller.'

/** The statements of both sides. Sellers tick what binds their own side, buyers every condition. */
export function collectTicks(question: GateQuestion, readings: readonly PartyReading[]) {
  const shared: GateTick[] = []
  if (question.crossesLine) shared.push({ id: 'crossing', text: crossing })
  const unread = readings
    .filter((one) => one.counts && one.status === 'unknown')
    .map((one) => one.jurisdiction)
  if (unread.length > 0) shared.push({ id: 'nobody-checked', text: uncheckedText(unread) })
  const release: GateTick[] =
    question.taxon.kind === 'plant' ? [] : [{ id: 'never-release', text: cautionTexts['G-1'] }]
  const sellerSide = readings.filter((one) => one.party === 'seller')
  return {
    ticks: [...release, ...shared, ...conditions(readings, question.today)],
    sellerTicks: [...shared, ...conditions(sellerSide, question.today)],
  }
}

function conditions(readings: readonly PartyReading[], today: string): GateTick[] {
  const rows = new Set(readings.flatMap((one) => one.rows))
  return [...rows]
    .filter((row) => !isOverdue(row, today))
    .flatMap((row) => row.conditions.map((text, at) => ({ id: `condition:${row.ruleKey}:${at + 1}`, text })))
}

function uncheckedText(jurisdictions: readonly string[]): string {
  const names = [...new Set(jurisdictions)].map((code) => findState(code)?.name ?? code)
  return fillCaution('G-3', { state: names.join(' and ') })
}
