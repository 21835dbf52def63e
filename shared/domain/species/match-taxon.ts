import { aliases, type AliasKind, type TaxonAlias } from '@/shared/domain/species/aliases.facts'
import { abbreviateGenus, normaliseName } from '@/shared/domain/species/normalise-name'
import { taxa } from '@/shared/domain/species/taxa.facts'
import type { Taxon } from '@/shared/domain/species/taxon'

export interface TaxonMatch {
  taxonId: string
  /** `scientific` and `abbreviated` are the accepted scientific name; the rest says which kind of alias it was. */
  how: 'scientific' | 'abbreviated' | AliasKind
}

type AliasRow = Pick<TaxonAlias, 'alias' | 'kind'> & { taxonId: string }
type Namebook = ReadonlyMap<string, TaxonMatch>

const longestName = 5

/** Index over names: scientific first, so that no alias can outbid one. Later aliases never replace earlier ones. */
export function bindNamebook(named: readonly Taxon[], alsoCalled: readonly AliasRow[]): Namebook {
  const book = new Map<string, TaxonMatch>()
  const add = (name: string, match: TaxonMatch) => {
    if (name !== '' && !book.has(name)) book.set(name, match)
  }
  for (const { id, scientificName } of named)
    add(normaliseName(scientificName), { taxonId: id, how: 'scientific' })
  for (const { id, scientificName, rank } of named) {
    if (rank !== 'species') continue
    add(abbreviateGenus(normaliseName(scientificName)), { taxonId: id, how: 'abbreviated' })
  }
  for (const { alias, taxonId, kind } of alsoCalled) {
    if (kind === 'synonym') add(normaliseName(alias), { taxonId, how: kind })
  }
  for (const { id, commonName } of named) add(normaliseName(commonName), { taxonId: id, how: 'accepted' })
  for (const { alias, taxonId, kind } of alsoCalled) add(normaliseName(alias), { taxonId, how: kind })
  return book
}

const ownNamebook = bindNamebook(taxa, aliases)

/** The taxon a typed name stands for. null: nobody's name that we know; a moderator looks. */
export function matchTaxon(typed: string, book: Namebook = ownNamebook): TaxonMatch | null {
  return book.get(normaliseName(typed)) ?? null
}

/** Every taxon named anywhere in a text, longest names first claimed; the second check on titles and descriptions. */
export function scanForTaxa(text: string, book: Namebook = ownNamebook): TaxonMatch[] {
  const words = normaliseName(text).split(' ')
  const found = new Map<string, TaxonMatch>()
  for (let at = 0; at < words.length;) {
    let taken = 1
    for (let length = Math.min(longestName, words.length - at); length >= 1; length--) {
      const match = book.get(words.slice(at, at + length).join(' '))
      if (!match) continue
      if (!found.has(match.taxonId)) found.set(match.taxonId, match)
      taken = length
      break
    }
    at += taken
  }
  return [...found.values()]
}
