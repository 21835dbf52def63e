import type { Tx } from '@/db/transaction'
import { now } from '@/server/clock'
import { askGate, taxaOf, type GateAsked } from '@/server/rules/ask-gate'
import { presentGate } from '@/server/rules/present-gate'
import { loadRules } from '@/server/rules/rule-store'
import type { GateVerdict } from '@/shared/contracts/rules'

/** What the legal gate says today about this batch for a buyer of that state, with its sources. */
export async function judgeListing(asked: GateAsked, tx?: Tx): Promise<GateVerdict> {
  const jurisdictions = [...new Set(['US', asked.sellerState, asked.buyerState])]
  const rules = await loadRules({ taxonIds: taxaOf(asked.body), jurisdictions }, tx)
  return presentGate(askGate(asked, rules, now().toISOString().slice(0, 10)), asked)
}
