import { seasonOptionIds } from '@/shared/domain/season/season-classes.facts'
import { valueOf } from '@/shared/domain/season/season-code'
import { animalClassIds, packingClassIds } from '@/shared/domain/season/season-lane'
import { LEVELS } from '@/shared/domain/season/season-scale'
import { weekDays, type SeasonTable } from '@/shared/domain/season/season-table'
import { bears } from '@/scripts/season/season-limits'

/** Every limit of the table that the trip engine does not bear out at its own two days; `everyNth` looks at a part. */
export function mildLimits(table: SeasonTable, everyNth: number): { looked: number; mild: string[] } {
  const mild: string[] = []
  let [seen, looked] = [0, 0]
  for (const animals of animalClassIds) {
    for (const packing of packingClassIds) {
      for (const option of seasonOptionIds) {
        for (const day of weekDays) {
          const limits = table.limits[`${animals} ${packing}`]?.[option][day] ?? ''
          for (let from = 0; from < LEVELS; from++) {
            const least = valueOf(limits, from)
            if (least === null || seen++ % everyNth !== 0) continue
            looked++
            if (!bears({ animals, packing, option }, day, [from, least]))
              mild.push(`${animals} ${packing} ${option} ${day}: level ${from} to ${least}`)
          }
        }
      }
    }
  }
  return { looked, mild }
}
