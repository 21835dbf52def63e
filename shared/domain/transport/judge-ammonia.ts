import type { Reason } from '@/shared/domain/transport/verdict'
import type { SpeciesRecord } from '@/shared/domain/species/species-record'

/** Trout: 0.13 mg/L over six hours and more harmed (Piper et al. 1982 p. 357). */
const COLD_WATER_HARM_MG_PER_L = 0.13
/** House rule where no killing figure is known: a quarter of the 2.0 mg/L that kills fish in general. */
const USUAL_HARM_MG_PER_L = 0.5
/** UF/IFAS FA16: 0.05 mg/L harms over time. */
const USUAL_CHRONIC_MG_PER_L = 0.05

/** What un-ionised ammonia (mg N per L, the highest of the way) speaks against. */
export function judgeAmmonia(species: SpeciesRecord, nh3NMgPerL: number): Reason[] {
  const known = species.uiaKillMgPerL === null ? USUAL_HARM_MG_PER_L : species.uiaKillMgPerL / 2
  const harm =
    species.thermalClass === 'cold' ? COLD_WATER_HARM_MG_PER_L : Math.min(known, USUAL_HARM_MG_PER_L)
  const chronic = species.uiaChronicMgPerL ?? USUAL_CHRONIC_MG_PER_L
  const common = { value: nh3NMgPerL, atHour: null }
  if (nh3NMgPerL > harm)
    return [{ code: 'ammonia-high', verdict: 'unsafe', limit: harm, sourceKey: 'piper-1982', ...common }]
  if (nh3NMgPerL > chronic) {
    return [{ code: 'ammonia-raised', verdict: 'caution', limit: chronic, sourceKey: 'ifas-fa16', ...common }]
  }
  return []
}
