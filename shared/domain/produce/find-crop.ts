import type { Crop } from '@/shared/domain/produce/crop'
import { crops } from '@/shared/domain/produce/crops.facts'
import { matchTaxon } from '@/shared/domain/species/match-taxon'
import { normaliseName } from '@/shared/domain/species/normalise-name'

const byId = new Map(crops.map((crop) => [crop.id, crop]))
const byName = new Map(
  crops.flatMap((crop) =>
    [crop.name, ...crop.alsoCalled].map((name) => [normaliseName(name), crop] as const),
  ),
)

/** null: not a crop of ours. */
export function findCrop(id: string): Crop | null {
  return byId.get(id) ?? null
}

/**
 * The crop a typed name stands for; 'kangkong' and every other name of a plant the species gate watches leads to that
 * plant. null: not a name we know; the grower picks from the list.
 */
export function matchCrop(typed: string): Crop | null {
  const named = byName.get(normaliseName(typed))
  if (named) return named
  const taxonId = matchTaxon(typed)?.taxonId
  return crops.find((crop) => crop.taxonId !== null && crop.taxonId === taxonId) ?? null
}
