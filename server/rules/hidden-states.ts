import { askGate, type GateAsked } from '@/server/rules/ask-gate'
import { gateOf } from '@/shared/domain/listings/gated-lot'
import { findState } from '@/shared/domain/rules/find-state'
import type { SpeciesRule } from '@/shared/domain/rules/species-rule'
import { stateBit, usStates } from '@/shared/domain/rules/state-bits'

const known = new Map<string, bigint>()
const MOST_KNOWN = 2000

/**
 * One bit for each state whose people must not be shown this batch. Judging fifty states costs some milliseconds and
 * every order projects its listing anew, so answers are kept; rows never change, so their keys and versions name them.
 */
export function hiddenStates(
  batch: Pick<GateAsked, 'body' | 'sellerState'>,
  rules: readonly SpeciesRule[],
  today: string,
): bigint {
  const { taxonId, papers, isAnimal } = gateOf(batch.body)
  if (taxonId === null) return 0n
  const read = rules.map((rule) => `${rule.ruleKey}.${rule.version}`).join()
  const key = [taxonId, batch.sellerState, /\d/.test(papers), today, read].join('|')
  const before = known.get(key)
  if (before !== undefined) return before
  let mask = 0n
  for (const buyerState of usStates) {
    const served = !isAnimal || findState(buyerState)?.takesAnimals === true
    const judged = askGate({ ...batch, buyerState, viewer: 'visitor' }, rules, today)
    if (!served || judged?.effect.visible === false) mask |= stateBit(buyerState) ?? 0n
  }
  if (known.size >= MOST_KNOWN) known.clear()
  known.set(key, mask)
  return mask
}
