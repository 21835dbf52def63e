import { findState } from '@/shared/domain/rules/find-state'
import type { GateVerdict } from '@/shared/contracts/rules'

type Reason = GateVerdict['reasons'][number]

// What the letters of a rule row stand for; an unknown letter is not made to look surer than it is.
const confidences: Record<string, string> = {
  P: 'Read in the source itself.',
  S: 'Read in somebody else’s summary, not in the source itself.',
  H: 'Hearsay: a hint, never a permission.',
  D: 'Demonstration only, not a reading of any law.',
}

const activities: Record<string, string> = {
  possess: 'keeping',
  sell: 'selling',
  transport: 'transporting',
  import: 'importing',
  culture: 'raising',
  stock: 'stocking outdoors',
}

const statuses: Record<GateVerdict['status'], string> = {
  allowed: 'Allowed, by what we found',
  allowed_with_conditions: 'Allowed under conditions',
  permit_buyer: 'You need a permit',
  permit_seller: 'The seller needs a permit',
  permit_both: 'Both sides need a permit',
  unknown: 'Nobody has checked this for us',
  prohibited: 'Not for sale to you',
}

export const confidenceWords = ({ confidence }: Pick<Reason, 'confidence'>) =>
  confidences[confidence] ?? 'We do not know how sure this is.'

/** "Keeping: Ohio". */
export function reasonTitle({ activity, jurisdiction }: Pick<Reason, 'activity' | 'jurisdiction'>): string {
  const act = activities[activity] ?? activity
  const place = jurisdiction === 'US' ? 'United States' : (findState(jurisdiction)?.name ?? jurisdiction)
  return `${act.charAt(0).toUpperCase()}${act.slice(1)}: ${place}`
}

/** The status of one reason or of the whole in a sentence; what is not one of ours reads as unchecked. */
export function statusWords(status: string): string {
  return Object.hasOwn(statuses, status) ? statuses[status as GateVerdict['status']] : statuses.unknown
}
