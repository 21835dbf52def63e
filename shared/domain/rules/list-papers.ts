import { findState } from '@/shared/domain/rules/find-state'
import type { GateQuestion } from '@/shared/domain/rules/gate-question'
import type { PartyReading } from '@/shared/domain/rules/read-parties'
import { isOverdue } from '@/shared/domain/rules/species-rule'

const permitText: Partial<Record<PartyReading['status'], string>> = {
  permit_buyer: "The buyer's permit",
  permit_seller: "The seller's permit or licence",
  permit_both: "The buyer's and the seller's permit",
}

/** What must be on file before the hand-over, in words, each once. */
export function listPapers(question: GateQuestion, readings: readonly PartyReading[]): string[] {
  const papers = new Set<string>()
  for (const { rows, status, jurisdiction } of readings.filter((one) => one.counts)) {
    const named = rows.filter((row) => !isOverdue(row, question.today)).flatMap((row) => row.papersNeeded)
    for (const paper of named) papers.add(paper)
    const permit = permitText[status]
    if (permit && named.length === 0) papers.add(`${permit} for ${placeName(jurisdiction)}`)
    if (status === 'allowed_with_conditions' && question.crossesLine) {
      papers.add('Papers for the route, attached by the seller')
    }
  }
  if (question.crossesLine && question.taxon.flags.includes('salmonid-papers')) {
    papers.add(`Salmonid health papers for ${placeName(question.buyerState)}`)
  }
  if (question.taxon.flags.includes('protected-papers')) {
    papers.add('Papers for a protected animal, looked at by a moderator')
  }
  return [...papers]
}

const placeName = (code: string) => (code === 'US' ? 'the United States' : (findState(code)?.name ?? code))
