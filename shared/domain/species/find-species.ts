import { speciesFacts, type SpeciesId } from '@/shared/domain/species/species.facts'
import type { SpeciesRecord } from '@/shared/domain/species/species-record'

const byId = new Map<string, SpeciesRecord<SpeciesId>>(speciesFacts.map((species) => [species.id, species]))
const byCode = new Map(speciesFacts.map((species) => [species.speciesCode, species]))

/** Care facts by species id. null: we hold no figures for it. */
export function findSpecies(id: string): SpeciesRecord<SpeciesId> | null {
  return byId.get(id) ?? null
}

/** Care facts by the small integer of the search tables. null: no such code. */
export function findSpeciesByCode(speciesCode: number): SpeciesRecord<SpeciesId> | null {
  return byCode.get(speciesCode) ?? null
}
