import type { GateQuestion } from '@/shared/domain/rules/gate-question'
import { readActivity, type ActivityReading } from '@/shared/domain/rules/read-activity'
import type { RuleActivity } from '@/shared/domain/rules/species-rule'

export interface PartyReading extends ActivityReading {
  party: 'seller' | 'hand-over' | 'buyer'
  /** Silence on a core activity means unknown; on the others it means nothing. */
  counts: boolean
}

interface Role {
  party: PartyReading['party']
  state: string
  core: RuleActivity[]
  extra: RuleActivity[]
}

/** Every activity of the order, read in the state of whoever does it, and the nation's rows beside each. */
export function readParties(question: GateQuestion): PartyReading[] {
  const { sellerState, handOverState, buyerState, crossesLine } = question
  const roles: Role[] = [
    { party: 'seller', state: sellerState, core: ['sell'], extra: ['culture'] },
    { party: 'hand-over', state: handOverState, core: ['transport'], extra: [] },
    {
      party: 'buyer',
      state: buyerState,
      core: crossesLine ? ['possess', 'import'] : ['possess'],
      extra: ['stock'],
    },
  ]
  return roles.flatMap(({ party, state, core, extra }) => {
    const read = (jurisdiction: string, activity: RuleActivity, isCore: boolean): PartyReading => {
      const reading = readActivity(question.taxon, { ...question, jurisdiction, activity })
      return { ...reading, party, counts: isCore || !reading.isMissing }
    }
    return [
      ...core.map((activity) => read(state, activity, true)),
      ...extra.map((activity) => read(state, activity, false)),
      ...[...core, ...extra].map((activity) => read('US', activity, false)),
    ]
  })
}
