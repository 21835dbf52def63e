import { growingWarmthC } from '@/shared/domain/growth/growing-warmth'
import { lengthAfter, massAfterG } from '@/shared/domain/growth/thermal-growth'
import type { SpeciesRecord } from '@/shared/domain/species/species-record'

interface Growing {
  species: SpeciesRecord
  massG: number
  lengthMm: number
  waterC: number
  days: number
}

interface Size {
  massG: number
  lengthMm: number
}

/**
 * Size after `days` at one temperature, from the slow to the fast end of the species' growth coefficient.
 * null: no coefficient for the animal, too warm to feed, or a figure out of range.
 */
export function forecastGrowth(growing: Growing): { slow: Size; fast: Size } | null {
  const { species, massG, waterC, lengthMm, days } = growing
  const warmthC = growingWarmthC(species, waterC)
  if (!species.tgcX1000 || warmthC === null) return null
  const ends = species.tgcX1000.map((tgcX1000) => {
    const grownG = massAfterG({ massG, tgcX1000, waterC: warmthC, days })
    const grownMm = grownG && lengthAfter(lengthMm, massG, grownG)
    return grownG && grownMm ? { massG: grownG, lengthMm: grownMm } : null
  })
  const [slow, fast] = ends
  return slow && fast ? { slow, fast } : null
}
