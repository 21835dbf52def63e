import { speciesWords } from './category-words'

import type { ComboboxChoice } from '@/components/ui/combobox'
import { matchTaxon } from '@/shared/domain/species/match-taxon'
import { normaliseName } from '@/shared/domain/species/normalise-name'
import { taxa } from '@/shared/domain/species/taxa.facts'
import type { Taxon } from '@/shared/domain/species/taxon'

// The taxa that care figures hang on: those are the species that search tells apart.
const searchable: readonly Taxon[] = taxa.filter((taxon) => taxon.id === taxon.speciesId)
const byId = new Map<string, Taxon>(taxa.map((taxon) => [taxon.id, taxon]))

/** Species whose common, scientific or other name fits what was typed: "tilapia", "O. niloticus", "talapia". */
export function speciesChoices(typed: string): ComboboxChoice[] {
  const wanted = normaliseName(typed)
  if (wanted === '') return []
  const named = matchTaxon(typed)?.taxonId
  return searchable.filter((taxon) => fits(taxon, wanted) || isWithin(taxon, named)).map(toChoice)
}

/** The species a typed text means without doubt: the only one that fits. undefined: none, or several. */
export function onlySpecies(typed: string): ComboboxChoice | undefined {
  const choices = speciesChoices(typed)
  return choices.length === 1 ? choices[0] : undefined
}

/** A species by its English name; its id in words when it is not one of ours. */
export function speciesName(speciesId: string): string {
  return byId.get(speciesId)?.commonName ?? speciesWords(speciesId)
}

const fits = ({ commonName, scientificName }: Taxon, wanted: string) =>
  normaliseName(commonName).includes(wanted) || normaliseName(scientificName).includes(wanted)

function isWithin(taxon: Taxon, ancestorId: string | undefined): boolean {
  for (let at: Taxon | undefined = taxon; at; at = at.parentId ? byId.get(at.parentId) : undefined) {
    if (at.id === ancestorId || at.hybridParents?.some((parent) => parent === ancestorId)) return true
  }
  return false
}

const toChoice = ({ id, commonName, scientificName }: Taxon): ComboboxChoice => ({
  id,
  label: commonName,
  detail: scientificName,
})
