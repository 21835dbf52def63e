import type { SpeciesId } from '@/shared/domain/species/species.facts'

export type TaxonRank = 'group' | 'family' | 'genus' | 'species' | 'hybrid'
export type TaxonKind = 'fish' | 'crustacean' | 'mollusc' | 'worm' | 'insect' | 'plant'

/** `salmonid-papers`: ask for salmonid health papers by state. `protected-papers`: a moderator looks, always. */
export type TaxonFlag = 'salmonid-papers' | 'protected-papers'

/** A name the law can speak of. Rules and blocks hang on taxa; care figures hang on species. */
export interface Taxon {
  id: string
  rank: TaxonRank
  kind: TaxonKind
  scientificName: string
  commonName: string
  parentId: string | null
  /** Both parents of a cross; it takes the worse status of the two. */
  hybridParents: readonly [string, string] | null
  /** The record with care figures, when we hold one. */
  speciesId: SpeciesId | null
  flags: readonly TaxonFlag[]
}
