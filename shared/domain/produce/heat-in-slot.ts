import type { Crop } from '@/shared/domain/produce/crop'
import type { SourceKey } from '@/shared/sources'
import { printBothTemperatures } from '@/shared/units/temperature'

// A closed car gained 26 °C in an hour of sun. The limits are our own.
export const slotHeatSources: readonly SourceKey[] = ['grundstein-2010', 'house-rule']

/** From this air on, a cooler is advised. */
export const COOLER_FROM_C = 27
/** Greens handed over later than this on such a day get a caution. */
export const GREENS_UNTIL_HOUR = 11

interface SlotHeat {
  /** Warmest air forecast in the slot; null: no forecast. */
  warmestC: number | null
  /** Hours of the day at the place, fractions allowed. */
  untilHour: number
  crop: Crop
}

export interface SlotAdvice {
  verdict: 'fine' | 'cooler' | 'caution' | 'unknown'
  cooler: string | null
  caution: string | null
}

const wilts = (crop: Crop) => crop.isLeafyGreen || crop.group === 'herb' || crop.group === 'microgreen'

/** What heat in a pickup slot asks of greens. It advises and cautions; it never refuses a slot. */
export function adviseSlotHeat({ warmestC, untilHour, crop }: SlotHeat): SlotAdvice {
  if (warmestC === null) return { verdict: 'unknown', cooler: null, caution: null }
  if (warmestC < COOLER_FROM_C) return { verdict: 'fine', cooler: null, caution: null }
  const air = printBothTemperatures(warmestC, 'us')
  const ice = crop.chillsBelowC === null ? 'a cooler with ice' : 'a cooler, without ice on it'
  const cooler = `${air} is forecast: bring ${ice} and drive straight home. A closed car gets far hotter.`
  if (!wilts(crop) || untilHour <= GREENS_UNTIL_HOUR) return { verdict: 'cooler', cooler, caution: null }
  return {
    verdict: 'caution',
    cooler,
    caution: `${crop.name}: wilts fast at ${air}. A slot that ends by 11:00 would be kinder; keep it cold until the hand-over.`,
  }
}
