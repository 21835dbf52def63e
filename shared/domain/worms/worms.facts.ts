import type { TaxonId } from '@/shared/domain/species/taxa.facts'

export interface WormKind {
  taxonId: TaxonId
  /** One of many: '250 worms', '1,000 larvae'. */
  many: 'worms' | 'larvae'
}

/** What the category of worms lists. Counts per pound stand with the species, from secondary pages. */
export const wormKinds: readonly WormKind[] = [
  { taxonId: 'red_wiggler', many: 'worms' },
  { taxonId: 'european_nightcrawler', many: 'worms' },
  { taxonId: 'canadian_nightcrawler', many: 'worms' },
  { taxonId: 'black_soldier_fly_larvae', many: 'larvae' },
]
