import type { Caution } from './caution-list'

import type { GateVerdict } from '@/shared/contracts/rules'
import { cautionTexts, type CautionId } from '@/shared/domain/rules/caution-texts.facts'

// Said wherever live animals change hands at a meeting, whatever the law says.
const always: readonly CautionId[] = ['G-1', 'G-12', 'G-13']

/** The cautions of a listing: those of the legal gate, then the ones that stand without it; each once, in order. */
export function listingCautions(gate: GateVerdict | undefined): Caution[] {
  const told = new Map<string, string>(gate?.cautions.map(({ id, text }) => [id, text]))
  for (const id of always) if (!told.has(id)) told.set(id, cautionTexts[id])
  // What has no number of its own (our rule for a state apart) comes first.
  const number = (id: string) => Number(/^G-(\d+)$/.exec(id)?.[1] ?? 0)
  return Array.from(told, ([id, text]) => ({ id, text })).sort((a, b) => number(a.id) - number(b.id))
}
