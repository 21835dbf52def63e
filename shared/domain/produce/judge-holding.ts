import type { Crop } from '@/shared/domain/produce/crop'
import type { ProduceForm } from '@/shared/domain/produce/judge-form'
import type { SourceKey } from '@/shared/sources'
import { printBothTemperatures } from '@/shared/units/temperature'

export const holdingSources: readonly SourceKey[] = ['food-code-2009', 'hollyer-2009']

/** 41 °F: cut leafy greens are held at this or colder. */
export const COLD_HOLD_C = 5

export const waterTouches = ['no', 'yes', 'not-sure'] as const
/** Whether water of the fish system reaches the part that is eaten. */
export type WaterTouch = (typeof waterTouches)[number]

interface Held {
  crop: Crop
  form: ProduceForm
  heldC: number
  touchesSystemWater: WaterTouch
  rinsedInDrinkingWater: boolean
}

/** Why a harvest kept like this cannot be sold in this form. null: nothing speaks against it. */
export function holdingFault({ crop, form, heldC }: Pick<Held, 'crop' | 'form' | 'heldC'>): string | null {
  if (form !== 'cut-mixed-or-washed' || !crop.isLeafyGreen || heldC <= COLD_HOLD_C) return null
  return `Cut leafy greens are kept at ${printBothTemperatures(COLD_HOLD_C, 'us')} or colder, from the cutting to the hand-over.`
}

/** Advice about how a harvest is kept and washed; never a block. */
export function adviseHolding(held: Held): string[] {
  const { crop, heldC, touchesSystemWater, rinsedInDrinkingWater } = held
  const told: string[] = []
  if (crop.chillsBelowC !== null && heldC < crop.chillsBelowC) {
    told.push(
      `${crop.name}: harmed below ${printBothTemperatures(crop.chillsBelowC, 'us')}. Keep it less cold.`,
    )
  }
  if (touchesSystemWater !== 'no') {
    told.push(
      rinsedInDrinkingWater
        ? 'Fish water can carry germs: keep it off the leaves, most of all at the harvest.'
        : 'Fish water can carry germs: keep it off the leaves, and rinse the harvest in drinking water.',
    )
  }
  return told
}
