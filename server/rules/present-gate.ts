import type { GateAsked } from '@/server/rules/ask-gate'
import type { GateVerdict } from '@/shared/contracts/rules'
import { findState } from '@/shared/domain/rules/find-state'
import type { GateJudgement } from '@/shared/domain/rules/gate'
import { wordCautions } from '@/shared/domain/rules/word-cautions'

const APART = {
  id: 'apart',
  text: 'We do not bring living animals to Alaska, Hawaii or the territories yet. That is our own rule.',
}

/** The judgement in words, for one reader; a place we do not serve with animals is refused whatever the rules say. */
export function presentGate(judged: GateJudgement, asked: GateAsked): GateVerdict {
  const { buyerState, sellerState, viewer } = asked
  const crossesStateLine = buyerState !== sellerState
  const served = findState(buyerState)?.takesAnimals === true
  if (!served) {
    return {
      ...{ status: 'prohibited', buy: 'no', crossesStateLine, buyerState },
      ...{ reasons: [], ticks: [], papersNeeded: [], demonstration: false },
      cautions: [APART],
    }
  }
  return {
    status: judged.status,
    buy: judged.effect.buy,
    crossesStateLine,
    buyerState,
    reasons: judged.reasons,
    ticks: viewer === 'seller' ? judged.sellerTicks : judged.ticks,
    cautions: wordCautions(judged, { buyerState }),
    papersNeeded: judged.papersNeeded,
    demonstration: judged.demonstration,
  }
}
