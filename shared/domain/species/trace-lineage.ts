import { findTaxon } from '@/shared/domain/species/find-taxon'
import type { TaxonFlag, TaxonKind } from '@/shared/domain/species/taxon'

/** What the legal gate needs to know of a taxon: ids from the most to the least specific. */
export interface TaxonLineage {
  id: string
  kind: TaxonKind
  /** The taxon itself, then its parent, and so on up. */
  self: readonly string[]
  /** The same for each parent of a cross; empty for everything else. */
  hybridParents: readonly (readonly string[])[]
  flags: readonly TaxonFlag[]
}

/** null: not a taxon of ours. */
export function traceLineage(taxonId: string): TaxonLineage | null {
  const taxon = findTaxon(taxonId)
  if (!taxon) return null
  const hybridParents = (taxon.hybridParents ?? []).map((parentId) => ancestry(parentId))
  const self = ancestry(taxon.id)
  const flags = [...self, ...hybridParents.flat()].flatMap((id) => findTaxon(id)?.flags ?? [])
  return { id: taxon.id, kind: taxon.kind, self, hybridParents, flags: [...new Set(flags)] }
}

function ancestry(taxonId: string): string[] {
  const line: string[] = []
  for (let at = findTaxon(taxonId); at; at = at.parentId === null ? null : findTaxon(at.parentId))
    line.push(at.id)
  return line
}
