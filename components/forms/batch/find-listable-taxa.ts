import { findBlock } from '@/shared/domain/rules/find-block'
import { aliases } from '@/shared/domain/species/aliases.facts'
import { matchTaxon } from '@/shared/domain/species/match-taxon'
import { normaliseName } from '@/shared/domain/species/normalise-name'
import { taxa } from '@/shared/domain/species/taxa.facts'
import { traceLineage } from '@/shared/domain/species/trace-lineage'
import type { Taxon } from '@/shared/domain/species/taxon'

const most = 8

/** Fish, crayfish and prawns that may be listed: species and crosses, none of them blocked. */
const listable = taxa
  .filter(
    ({ kind, rank }) =>
      (kind === 'fish' || kind === 'crustacean') && (rank === 'species' || rank === 'hybrid'),
  )
  .filter(({ id }) => !isBlocked(id))
  .map((taxon) => ({ taxon, names: namesOf(taxon) }))

export function isBlocked(taxonId: string): boolean {
  const lineage = traceLineage(taxonId)
  return lineage !== null && findBlock(lineage) !== null
}

/** The taxa whose scientific, common or trade name holds what was typed; names that begin with it come first. */
export function findListableTaxa(typed: string): Taxon[] {
  const wanted = normaliseName(typed)
  if (wanted === '') return []
  return listable
    .map(({ taxon, names }) => ({ taxon, rank: rankOf(names, wanted) }))
    .filter(({ rank }) => rank < 3)
    .sort((a, b) => a.rank - b.rank || isCross(a.taxon) - isCross(b.taxon) || byName(a.taxon, b.taxon))
    .slice(0, most)
    .map(({ taxon }) => taxon)
}

/** What to say when no taxon of the list holds what was typed. */
export function whyNotListed(typed: string): string {
  const match = matchTaxon(typed)
  if (match && isBlocked(match.taxonId))
    return 'We do not list this species. That is our policy for everyone.'
  return 'Not in our list yet. Try the scientific name, or ask us to add it.'
}

const isCross = (taxon: Taxon) => Number(taxon.rank === 'hybrid')
const byName = (a: Taxon, b: Taxon) => a.commonName.localeCompare(b.commonName, 'en')

function rankOf(names: readonly string[], wanted: string): number {
  return Math.min(
    ...names.map((name) =>
      name === wanted ? 0 : name.startsWith(wanted) ? 1 : name.includes(wanted) ? 2 : 3,
    ),
  )
}

function namesOf({ id, commonName, scientificName }: Taxon): string[] {
  const also = aliases.filter((alias) => alias.taxonId === id).map(({ alias }) => alias)
  return [commonName, scientificName, ...also].map(normaliseName)
}
