import type { SeasonPacks } from '@/shared/domain/season/season-classes.facts'
import type { Side } from '@/shared/domain/season/season-scale'

export interface SeasonTable {
  bands: number
  /** By side and nights on the way: a text a band, in it a level a week. Colder or hotter than the scale: none. */
  weeks: Readonly<Record<Side, Readonly<Record<1 | 2, readonly string[]>>>>
  /**
   * By 'animal-class packing-class', packs and side: for each level at the origin the harshest level at the destination
   * that is safe. Classes that are missing are unknown.
   */
  limits: Readonly<Record<string, Readonly<Record<SeasonPacks, Readonly<Record<Side, string>>>>>>
}
