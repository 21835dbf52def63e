import {
  blockList,
  guardedTaxa,
  type BlockedTaxon,
  type GuardedTaxon,
} from '@/shared/domain/rules/block-list.facts'
import type { TaxonLineage } from '@/shared/domain/species/trace-lineage'

/** The entry of the national block list that covers this taxon or a parent of it. null: none. */
export function findBlock(taxon: TaxonLineage): BlockedTaxon | null {
  return blockList.find((entry) => covers(entry.taxonId, taxon)) ?? null
}

/** The policy for taxa that stay inside one state and need a paper there. null: none. */
export function findGuard(taxon: TaxonLineage): GuardedTaxon | null {
  return guardedTaxa.find((entry) => covers(entry.taxonId, taxon)) ?? null
}

function covers(taxonId: string, taxon: TaxonLineage): boolean {
  return taxon.self.includes(taxonId) || taxon.hybridParents.some((line) => line.includes(taxonId))
}
