import type { Crop } from '@/shared/domain/produce/crop'
import type { SourceKey } from '@/shared/sources'
import { printBothTemperatures } from '@/shared/units/temperature'

export const companionSources: readonly SourceKey[] = ['ne-veg-guide', 'lange-cameron-1994', 'house-rule']

export type ParcelJudgement = { verdict: 'together' } | { verdict: 'refuse'; saying: string }

/** Whether crops may travel in one parcel: what needs near freezing and what is harmed by it go apart. */
export function judgeParcel(together: readonly Crop[], hasIce: boolean): ParcelJudgement {
  const tender = together.reduce<Crop | null>(
    (most, crop) => ((crop.chillsBelowC ?? -Infinity) > (most?.chillsBelowC ?? -Infinity) ? crop : most),
    null,
  )
  const limitC = tender?.chillsBelowC ?? null
  if (!tender || limitC === null) return { verdict: 'together' }
  const cold = together.find((crop) => crop.storeC !== null && crop.storeC[1] < limitC)
  const harm = `${tender.name}: harmed below ${printBothTemperatures(limitC, 'us')}`
  if (cold)
    return { verdict: 'refuse', saying: `${harm}; ${cold.name}: kept colder. Pack them in two parcels.` }
  return hasIce
    ? { verdict: 'refuse', saying: `${harm}. Leave the ice out, or pack them in another parcel.` }
    : { verdict: 'together' }
}
