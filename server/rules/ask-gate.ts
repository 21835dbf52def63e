import { gateOf, type GatedLot } from '@/shared/domain/listings/gated-lot'
import { judgeGate, type GateJudgement } from '@/shared/domain/rules/gate'
import type { Viewer } from '@/shared/domain/rules/gate-question'
import type { SpeciesRule } from '@/shared/domain/rules/species-rule'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

export interface GateAsked {
  body: GatedLot
  sellerState: string
  buyerState: string
  viewer: Viewer
  /** False while no moderator has seen the seller's licence numbers; only approved listings reach buyers. */
  approved?: boolean
}

/** Every name a rule about what is sold may hang on; none where no rule is about it. */
export function taxaOf(body: GatedLot): string[] {
  const lineage = traceLineage(gateOf(body).taxonId ?? '')
  return lineage ? [...new Set([...lineage.self, ...lineage.hybridParents.flat()])] : []
}

/**
 * Puts a pickup of this batch before the gate: it changes hands where the seller is. null: no living thing that any
 * rule is about.
 */
export function askGate(
  asked: GateAsked,
  rules: readonly SpeciesRule[],
  today: string,
): GateJudgement | null {
  const { taxonId, papers } = gateOf(asked.body)
  if (taxonId === null) return null
  const taxon = traceLineage(taxonId)
  if (!taxon) throw new Error(`no taxon ${taxonId}`)
  // A moderator who approves a listing has read the licence number on it; "none needed" is not a paper.
  const hasPaper = asked.approved !== false && /\d/.test(papers)
  return judgeGate({
    taxon,
    rules,
    sellerState: asked.sellerState,
    handOverState: asked.sellerState,
    buyerState: asked.buyerState,
    crossesLine: asked.sellerState !== asked.buyerState,
    today,
    viewer: asked.viewer,
    ...(hasPaper ? { acceptedPapers: ['seller'] as const } : {}),
  })
}
