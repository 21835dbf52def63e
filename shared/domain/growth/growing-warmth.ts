import type { SpeciesRecord } from '@/shared/domain/species/species-record'

/**
 * The °C that count for growth on a day of this temperature: none below feeding, the optimum's upper end at most (house
 * rule after Jobling's caution). null above the feeding range, where fish may lose weight or die: no forecast.
 */
export function growingWarmthC(species: SpeciesRecord, waterC: number): number | null {
  const [feedFrom, feedTo] = species.feedC
  if (!(waterC <= feedTo)) return null
  if (waterC < feedFrom) return 0
  return Math.min(waterC, species.optimumC[1])
}
