import type { CautionId } from '@/shared/domain/rules/caution-texts.facts'
import { collectTicks, type GateTick } from '@/shared/domain/rules/collect-ticks'
import { findBlock, findGuard } from '@/shared/domain/rules/find-block'
import { listReasons, type GateReason } from '@/shared/domain/rules/gate-reasons'
import type { GateQuestion, PaperHolder, Viewer } from '@/shared/domain/rules/gate-question'
import { listPapers } from '@/shared/domain/rules/list-papers'
import { readParties } from '@/shared/domain/rules/read-parties'
import type { RuleActivity, RuleStatus } from '@/shared/domain/rules/species-rule'
import { worstStatus } from '@/shared/domain/rules/worst-status'

/**
 * `yes`: nothing beyond the usual ticks. `ticks`: statements first. `reserve-only`: no hand-over before the paper is
 * accepted. `explicit-unknown`: after the page that says nobody has checked. `ask-moderators`: no pay button.
 */
export type Buying = 'yes' | 'ticks' | 'reserve-only' | 'explicit-unknown' | 'ask-moderators' | 'no'

export interface GateJudgement {
  status: RuleStatus
  effect: { visible: boolean; buy: Buying }
  /** Why our own policy, rather than a rule row, says no. null: it does not. */
  policy: string | null
  reasons: GateReason[]
  /** Where nobody has checked. */
  gaps: { jurisdiction: string; activity: RuleActivity }[]
  ticks: GateTick[]
  sellerTicks: GateTick[]
  papersNeeded: string[]
  cautions: CautionId[]
  demonstration: boolean
}

/**
 * May this be bought, and under what? Pure: the server decides with it and the screen shows the same early. Only
 * primary readings (and demonstration rows) decide; silence, and a row past its review day, mean `unknown`.
 */
export function judgeGate(question: GateQuestion): GateJudgement {
  const { taxon, crossesLine, viewer } = question
  const block = findBlock(taxon)
  const guard = findGuard(taxon)
  if (block) return refuse(block.why, viewer)
  if (guard && crossesLine) return refuse(guard.why, viewer)

  const readings = readParties(question)
  const statuses = readings.filter((one) => one.counts).map((one) => one.status)
  if (guard) statuses.push('permit_both')
  const status = worstStatus(statuses, crossesLine)
  const standing = statuses.map((one) => afterPapers(one, question.acceptedPapers ?? []))
  const buy = buyingUnder(worstStatus(standing, crossesLine), crossesLine)
  const isOpen = buy !== 'no' && buy !== 'ask-moderators'
  const reasons = listReasons(readings, question.today)
  return {
    status,
    effect: { visible: status !== 'prohibited' || isInside(viewer), buy },
    policy: null,
    reasons,
    gaps: readings
      .filter((one) => one.counts && one.isMissing)
      .map(({ jurisdiction, activity }) => ({ jurisdiction, activity })),
    ...(isOpen ? collectTicks(question, readings) : { ticks: [], sellerTicks: [] }),
    papersNeeded:
      status === 'prohibited' ? [] : [...listPapers(question, readings), ...(guard?.papers ?? [])],
    cautions: chooseCautions(question, statuses),
    demonstration: reasons.some((reason) => reason.confidence === 'D'),
  }
}

function buyingUnder(status: RuleStatus, crossesLine: boolean): Buying {
  switch (status) {
    case 'allowed':
      return crossesLine ? 'ticks' : 'yes'
    case 'allowed_with_conditions':
      return 'ticks'
    case 'permit_buyer':
    case 'permit_seller':
    case 'permit_both':
      return 'reserve-only'
    case 'unknown':
      return crossesLine ? 'ask-moderators' : 'explicit-unknown'
    case 'prohibited':
      return 'no'
  }
}

/** A permit whose paper is accepted weighs no more than a condition that is met. */
function afterPapers(status: RuleStatus, accepted: readonly PaperHolder[]): RuleStatus {
  const hasBuyers = accepted.includes('buyer')
  const hasSellers = accepted.includes('seller')
  if (status === 'permit_both') {
    if (hasBuyers && hasSellers) return 'allowed_with_conditions'
    return hasBuyers ? 'permit_seller' : hasSellers ? 'permit_buyer' : 'permit_both'
  }
  const isMet = (status === 'permit_buyer' && hasBuyers) || (status === 'permit_seller' && hasSellers)
  return isMet ? 'allowed_with_conditions' : status
}

function chooseCautions(question: GateQuestion, statuses: readonly RuleStatus[]): CautionId[] {
  const cautions: CautionId[] = question.taxon.kind === 'plant' ? [] : ['G-1']
  cautions.push('G-2')
  if (statuses.includes('unknown')) cautions.push('G-3')
  if (question.crossesLine) cautions.push('G-5')
  if (statuses.includes('permit_buyer') || statuses.includes('permit_both')) cautions.push('G-6')
  cautions.push('G-13')
  return cautions
}

function refuse(why: string, viewer: Viewer): GateJudgement {
  return {
    status: 'prohibited',
    effect: { visible: isInside(viewer), buy: 'no' },
    policy: why,
    reasons: [],
    gaps: [],
    ticks: [],
    sellerTicks: [],
    papersNeeded: [],
    cautions: ['G-4', 'G-13'],
    demonstration: false,
  }
}

/** The seller and the staff see what the public does not. */
const isInside = (viewer: Viewer) => viewer === 'seller' || viewer === 'staff'
