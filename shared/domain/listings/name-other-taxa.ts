import { findBlock } from '@/shared/domain/rules/find-block'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import { scanForTaxa } from '@/shared/domain/species/match-taxon'
import { traceLineage } from '@/shared/domain/species/trace-lineage'

export interface NamedTaxon {
  taxonId: string
  /** True: it, or a group it belongs to, is one we do not list. */
  blocked: boolean
}

/**
 * Animals and plants that a listing's words name beside the one that was picked: its own groups and, for a cross, the
 * parents do not count; worms and plants (feed, bed) only when blocked. A common name never decides: a moderator does.
 */
export function nameOtherTaxa(text: string, taxonId: string): NamedTaxon[] {
  const lineage = traceLineage(taxonId)
  const own = lineage ? [...lineage.self, ...lineage.hybridParents.flat()] : []
  return scanForTaxa(text)
    .filter((match) => !own.includes(match.taxonId))
    .map((match) => {
      const other = traceLineage(match.taxonId)
      return { taxonId: match.taxonId, blocked: other !== null && findBlock(other) !== null }
    })
    .filter(
      ({ taxonId: id, blocked }) => blocked || ['fish', 'crustacean'].includes(findTaxon(id)?.kind ?? ''),
    )
}
