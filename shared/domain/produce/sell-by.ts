import { dateOfNumber, dayNumberOf } from '@/shared/domain/calendar/day-number'
import type { Crop, KeepingTime } from '@/shared/domain/produce/crop'
import type { ProduceForm } from '@/shared/domain/produce/judge-form'
import type { SourceKey } from '@/shared/sources'

export interface SellBy {
  /** Last day of sale, YYYY-MM-DD. */
  day: string
  /** Days after the harvest: the short end of what the source says. */
  days: number
  sourceKey: SourceKey
}

interface Kept {
  crop: Crop
  form: ProduceForm
  /** Day of the harvest in the zone of the place, YYYY-MM-DD. */
  harvestDay: string
  heldC: number
}

/** How long a crop keeps at a temperature. null: nobody says. */
export function keepingTime(crop: Crop, heldC: number): KeepingTime | null {
  return crop.keeps.find((row) => heldC >= row.fromC && heldC <= row.toC) ?? null
}

/** Until which day a harvest is sold. null: nobody says, for that temperature or once it is cut; the grower must. */
export function sellBy({ crop, form, harvestDay, heldC }: Kept): SellBy | null {
  const row = keepingTime(crop, heldC)
  const harvested = dayNumberOf(harvestDay)
  if (!row || harvested === null || form === 'cut-mixed-or-washed') return null
  const days = row.days[0]
  return { day: dateOfNumber(harvested + days), days, sourceKey: row.sourceKey }
}
