import { findSpecies } from '@/shared/domain/species/find-species'
import { findTaxon } from '@/shared/domain/species/find-taxon'
import type { Range, SpeciesRecord } from '@/shared/domain/species/species-record'
import { printBothMasses } from '@/shared/domain/listings/sale-unit'
import { findWormKind } from '@/shared/domain/worms/find-worm-kind'
import { poundsFromG } from '@/shared/units/mass'
import { printCount } from '@/shared/units/count'
import { roundTo } from '@/shared/units/round-to'

function factsOf(taxonId: string): SpeciesRecord | null {
  const speciesId = findTaxon(taxonId)?.speciesId ?? null
  return speciesId === null ? null : findSpecies(speciesId)
}

/** About how many a packed weight holds, fewest to most. null: nobody says. */
export function countInWeight(taxonId: string, netG: number): Range | null {
  const perLb = factsOf(taxonId)?.countPerLb ?? null
  return perLb && [Math.round(perLb[0] * poundsFromG(netG)), Math.round(perLb[1] * poundsFromG(netG))]
}

/** What stands beside worms sold by weight: the packed weight counts, and about how many that is. */
export function packedWeightWords(taxonId: string, netG: number): string {
  const start = `${printBothMasses(netG)} when packed. They lose water on the way and take it up again.`
  const counted = countInWeight(taxonId, netG)
  const many = findWormKind(taxonId)?.many ?? 'worms'
  if (!counted) return start
  const [fewest, most] = counted.map((count) => printCount(roundTo(count, count >= 100 ? 10 : 1)))
  return `${start} About ${fewest} to ${most} ${many}.`
}
