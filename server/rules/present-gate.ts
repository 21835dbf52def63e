import type { GateAsked } from '@/server/rules/ask-gate'
import type { GateVerdict } from '@/shared/contracts/rules'
import { gateOf } from '@/shared/domain/listings/gated-lot'
import { fillCaution } from '@/shared/domain/rules/fill-caution'
import { findState } from '@/shared/domain/rules/find-state'
import type { GateJudgement } from '@/shared/domain/rules/gate'
import { wordCautions } from '@/shared/domain/rules/word-cautions'

const APART = {
  id: 'apart',
  text: 'We do not bring living animals to Alaska, Hawaii or the territories yet. That is our own rule.',
}

/** What every buyer of food reads first. */
const foodCautions = ({ body }: GateAsked) =>
  body.category === 'produce' ? [{ id: 'G-9', text: fillCaution('G-9', {}) }] : []

function presentUnruled(asked: GateAsked): GateVerdict {
  const { buyerState, sellerState } = asked
  return {
    ...{ status: 'allowed', buy: 'yes', crossesStateLine: buyerState !== sellerState, buyerState },
    ...{ reasons: [], ticks: [], papersNeeded: [], demonstration: false },
    cautions: [...foodCautions(asked), { id: 'G-13', text: fillCaution('G-13', {}) }],
  }
}

/** The judgement in words, for one reader; a place we do not serve with animals is refused whatever the rules say. */
export function presentGate(judged: GateJudgement | null, asked: GateAsked): GateVerdict {
  if (!judged) return presentUnruled(asked)
  const { buyerState, sellerState, viewer } = asked
  const crossesStateLine = buyerState !== sellerState
  const served = !gateOf(asked.body).isAnimal || findState(buyerState)?.takesAnimals === true
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
    cautions: [...foodCautions(asked), ...wordCautions(judged, { buyerState })],
    papersNeeded: judged.papersNeeded,
    demonstration: judged.demonstration,
  }
}
