import type { Bedding, Trip } from '@/shared/domain/transport/trip'
import type { Reason } from '@/shared/domain/transport/verdict'

/** Handbook rule of the house: worms and larvae without insulation are not posted below or above, °C outside air. */
export const BEDDING_AIR_C = [4, 27] as const
/** House rule: walls that hold back less than this are no insulation, m²·K per W; 25 mm of wet foam holds 0.56. */
const INSULATED_M2_K_PER_W = 0.3

/** Animals in bedding have no bag to reckon: what the outside air of the cold or the hot day speaks against. */
export function judgeBedding(
  { animals, legs, weather }: Trip,
  bedding: Bedding,
  side: 'cold' | 'hot',
): Reason[] {
  const { wallMm, conductivityWPerMK } = bedding.box
  if (animals.species.travels !== 'in-bedding') return []
  if (wallMm / 1000 / conductivityWPerMK >= INSULATED_M2_K_PER_W) return []
  const air = legs.flatMap((leg) => {
    if ('airC' in leg) return [leg.airC]
    const day = weather?.[leg.end][side]
    return day ? [day.minC, day.maxC] : []
  })
  const [low, high] = BEDDING_AIR_C
  const common = { verdict: 'unsafe', atHour: null, sourceKey: 'house-rule' } as const
  const [coldest, warmest] = [Math.min(...air), Math.max(...air)]
  return [
    ...(coldest < low ? [{ code: 'air-too-cold', value: coldest, limit: low, ...common } as const] : []),
    ...(warmest > high ? [{ code: 'air-too-warm', value: warmest, limit: high, ...common } as const] : []),
  ]
}
