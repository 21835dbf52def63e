import { seasonOptions, type SeasonOption } from '@/shared/domain/season/season-classes.facts'
import type { Side } from '@/shared/domain/season/season-scale'

/** Harshest and mildest cold day, harshest and mildest hot day of a week. */
export type WeekDay = 'cold' | 'mildCold' | 'hot' | 'mildHot'

export const weekDays: readonly WeekDay[] = ['cold', 'mildCold', 'hot', 'mildHot']

/** On which scale each stands: on a mild cold day the box may get too warm, on a mild hot day too cold. */
export const scaleOf: Readonly<Record<WeekDay, Side>> = {
  cold: 'cold',
  mildCold: 'hot',
  hot: 'hot',
  mildHot: 'cold',
}

/** Nobody puts heat packs in for heat, nor ice for frost. */
export function mayServe(option: SeasonOption, day: WeekDay): boolean {
  const { kind } = seasonOptions[option]
  return kind === 'none' || (kind === 'heat') === (day === 'cold' || day === 'mildCold')
}

export interface SeasonTable {
  bands: number
  /** By kind of day and nights on the way: a text a band, in it a level a week. Beyond a scale: none. */
  weeks: Readonly<Record<WeekDay, Readonly<Record<1 | 2, readonly string[]>>>>
  /**
   * By 'animal-class packing-class', option and kind of day: for each level at the origin the harshest level at the
   * destination that is safe. Classes that are missing are unknown.
   */
  limits: Readonly<Record<string, Readonly<Record<SeasonOption, Readonly<Partial<Record<WeekDay, string>>>>>>>
}
