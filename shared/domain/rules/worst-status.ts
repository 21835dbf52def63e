import type { RuleStatus } from '@/shared/domain/rules/species-rule'

const betweenStates: Record<RuleStatus, number> = {
  allowed: 0,
  allowed_with_conditions: 1,
  permit_buyer: 2,
  permit_seller: 2,
  permit_both: 2,
  unknown: 3,
  prohibited: 4,
}

// Inside one state an unknown can still be bought after an explicit page, so a permit somebody asks for weighs more.
const insideOneState: Record<RuleStatus, number> = {
  ...betweenStates,
  unknown: 1.5,
}

/** The status that binds when several hold at once; a buyer's and a seller's permit together are `permit_both`. */
export function worstStatus(statuses: readonly RuleStatus[], crossesLine: boolean): RuleStatus {
  const badness = crossesLine ? betweenStates : insideOneState
  return statuses.reduce<RuleStatus>((worst, status) => {
    if (badness[status] > badness[worst]) return status
    const isPermitPair = badness[status] === 2 && badness[worst] === 2 && status !== worst
    return isPermitPair ? 'permit_both' : worst
  }, 'allowed')
}
