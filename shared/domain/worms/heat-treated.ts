import type { MediaMaterial } from '@/shared/domain/media/media.facts'
import type { SourceKey } from '@/shared/sources'
import { printBothTemperatures } from '@/shared/units/temperature'

/** Compost heated to 131 °F under a pathogen-reduction process: worms and their eggs die. */
export const HEAT_KILLS_C = 55
export const heatTreatedSources: readonly SourceKey[] = ['umn-jumping-worms', 'mn-worms-2024']

export const heatAnswers = ['yes', 'no', 'unknown'] as const
export type HeatAnswer = (typeof heatAnswers)[number]

/** What buyers read about castings, compost and coir. null: nothing to say. */
export function heatCaution(material: MediaMaterial, answer: HeatAnswer): string | null {
  if (!material.mayCarryWorms || answer === 'yes') return null
  const start = answer === 'no' ? 'Not heat treated' : 'Nobody knows whether it was heat treated'
  return `${start}: it may hold worms or their eggs. Compost heated to ${printBothTemperatures(HEAT_KILLS_C, 'us')} holds none.`
}
