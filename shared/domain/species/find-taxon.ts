import { taxa } from '@/shared/domain/species/taxa.facts'
import type { Taxon } from '@/shared/domain/species/taxon'

const byId = new Map(taxa.map((taxon) => [taxon.id, taxon]))

/** null: not a taxon of ours. */
export function findTaxon(id: string): Taxon | null {
  return byId.get(id) ?? null
}
