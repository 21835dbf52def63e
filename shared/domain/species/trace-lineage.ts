import { findTaxon } from '@/shared/domain/species/find-taxon'
import type { TaxonKind } from '@/shared/domain/species/taxon'

/** What the legal gate needs to know of a taxon: ids from the most to the least specific. */
export interface TaxonLineage {
  id: string
  kind: TaxonKind
  /** The taxon itself, then its parent, and so on up. */
  self: readonly string[]
  /** The same for each parent of a cross; empty for everything else. */
  hybridParents: readonly (readonly string[])[]
}

/** null: not a taxon of ours. */
export function traceLineage(taxonId: string): TaxonLineage | null {
  const taxon = findTaxon(taxonId)
  if (!taxon) return null
  const hybridParents = (taxon.hybridParents ?? []).map((parentId) => ancestry(parentId))
  return { id: taxon.id, kind: taxon.kind, self: ancestry(taxon.id), hybridParents }
}

function ancestry(taxonId: string): string[] {
  const line: string[] = []
  for (let at = findTaxon(taxonId); at; at = at.parentId === null ? null : findTaxon(at.parentId))
    line.push(at.id)
  return line
}
