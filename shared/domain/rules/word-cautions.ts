import { printDateOfYear } from '@/shared/domain/calendar/print-date'
import { type CautionId } from '@/shared/domain/rules/caution-texts.facts'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import { findState } from '@/shared/domain/rules/find-state'
import type { GateJudgement } from '@/shared/domain/rules/gate'

export interface WordedCaution {
  id: CautionId
  text: string
}

interface Place {
  buyerState: string
  /** Until when a reservation waits for the buyer's permit, in words; 'the reservation ends' when absent. */
  holdUntil?: string
}

/** The cautions of a judgement as a reader sees them. One that would have nothing to say is left out. */
export function wordCautions(judgement: GateJudgement, place: Place): WordedCaution[] {
  return judgement.cautions.flatMap((id) => {
    const text = wordOne(id, judgement, place)
    return text === null ? [] : [{ id, text }]
  })
}

function wordOne(id: CautionId, judgement: GateJudgement, { buyerState, holdUntil }: Place): string | null {
  const agency = `the fish and wildlife agency of ${stateName(buyerState)}`
  if (id === 'G-2') {
    const deciding = judgement.reasons.find(
      (one) => !one.hint && !one.overdue && one.status === judgement.status,
    )
    const told = deciding ?? judgement.reasons[0]
    return told
      ? fillCaution('G-2', { source: told.sourceTitle, date: printDateOfYear(told.checkedOn), agency })
      : null
  }
  if (id === 'G-3') {
    const unread = new Set(judgement.gaps.map((gap) => gap.jurisdiction))
    for (const reason of judgement.reasons)
      if (reason.overdue && !reason.hint) unread.add(reason.jurisdiction)
    return fillCaution('G-3', { state: [...unread].map(stateName).join(' and ') })
  }
  if (id === 'G-6') return fillCaution('G-6', { date: holdUntil ?? 'the reservation ends' })
  if (id === 'G-1' || id === 'G-4' || id === 'G-5' || id === 'G-13') return fillCaution(id, {})
  return null
}

const stateName = (code: string) => findState(code)?.name ?? code
