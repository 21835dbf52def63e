import { judgeGate, type GateJudgement } from '@/shared/domain/rules/gate'
import type { Viewer } from '@/shared/domain/rules/gate-question'
import type { SpeciesRule } from '@/shared/domain/rules/species-rule'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

export interface GateAsked {
  body: { taxonId: string; licenceNumbers: string }
  sellerState: string
  buyerState: string
  viewer: Viewer
  /** False while no moderator has seen the seller's licence numbers; only approved listings reach buyers. */
  approved?: boolean
}

/** Every name a rule about this animal may hang on. */
export function taxaOf(taxonId: string): string[] {
  const lineage = traceLineage(taxonId)
  return lineage ? [...new Set([...lineage.self, ...lineage.hybridParents.flat()])] : []
}

/** Puts a pickup of this batch before the gate: the animals change hands where the seller is. */
export function askGate(asked: GateAsked, rules: readonly SpeciesRule[], today: string): GateJudgement {
  const taxon = traceLineage(asked.body.taxonId)
  if (!taxon) throw new Error(`no taxon ${asked.body.taxonId}`)
  // A moderator who approves a listing has read the licence number on it; "none needed" is not a paper.
  const hasPaper = asked.approved !== false && /\d/.test(asked.body.licenceNumbers)
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
