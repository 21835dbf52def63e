import type { Range } from '@/shared/domain/species/species-record'

/** Days that `degreeDaysC` take at one temperature, early and late. null for 0 °C and below, where nothing develops. */
export function daysOfDegreeDays([from, to]: Range, waterC: number): Range | null {
  return waterC > 0 ? [from / waterC, to / waterC] : null
}
